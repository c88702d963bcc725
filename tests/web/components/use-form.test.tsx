import { ErrorSummary } from '@embertally/web/src/components/error-summary.tsx';
import { TextField } from '@embertally/web/src/components/text-field.tsx';
import { useForm } from '@embertally/web/src/components/use-form.ts';
import { UnprocessableError } from '@embertally/web/src/lib/api-errors.ts';
import { act, fireEvent, render, screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';

interface Sent {
  readonly name: string;
  readonly secret: string;
}

function Form({ submit }: { readonly submit: (values: Sent) => Promise<void> }) {
  const form = useForm({
    name: 'sample',
    initial: { name: '', secret: '' },
    keep: ['name'],
    validate: (values) => ({ name: values.name === '' ? 'Enter a name' : undefined }),
    submit,
  });
  return (
    <form noValidate onSubmit={form.onSubmit}>
      <ErrorSummary {...form.summary} />
      <TextField label="Name" {...form.field('name')} />
      <TextField label="Secret" {...form.field('secret')} />
      <button type="submit">Send</button>
    </form>
  );
}

const type = (label: string, value: string) => {
  fireEvent.change(screen.getByLabelText(label), { target: { value } });
};
const send = () => {
  fireEvent.click(screen.getByRole('button', { name: 'Send' }));
};

function refusal(errors: { pointer: string; code: string; message: string }[]): UnprocessableError {
  return new UnprocessableError({
    type: 'about:blank',
    title: 'x',
    status: 422,
    detail: 'Nothing was saved.',
    instance: '/',
    requestId: 'r',
    errors,
  });
}

describe('a form', () => {
  it('is never sent with a fault it can see, and the button stays pressable', () => {
    let sent = 0;
    render(
      <Form
        submit={() => {
          sent += 1;
          return Promise.resolve();
        }}
      />,
    );
    send();
    send();
    expect(sent).toBe(0);
    expect(screen.getByRole<HTMLButtonElement>('button', { name: 'Send' }).disabled).toBe(false);
    expect(screen.getAllByText('Enter a name')).toHaveLength(2);
  });

  it('drops the fault of a field when that field is changed', () => {
    render(<Form submit={() => Promise.resolve()} />);
    send();
    type('Name', 'a');
    expect(screen.queryByText('Enter a name')).toBeNull();
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('shows what the server refuses at its field, and the rest for the whole form', async () => {
    render(
      <Form
        submit={() =>
          Promise.reject(
            refusal([
              { pointer: '/name', code: 'taken', message: 'The name is taken' },
              { pointer: '/elsewhere', code: 'odd', message: 'Something else is odd' },
            ]),
          )
        }
      />,
    );
    type('Name', 'kept');
    send();
    await screen.findAllByText('The name is taken');
    expect(screen.getByLabelText('Name').getAttribute('aria-invalid')).toBe('true');
    expect(screen.getByText('Something else is odd').closest('a')).toBeNull();
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('kept');
  });

  it('says the server’s own sentence when no field is named', async () => {
    render(<Form submit={() => Promise.reject(refusal([]))} />);
    type('Name', 'a');
    send();
    expect((await screen.findByRole('alert')).textContent).toContain('Nothing was saved.');
  });

  it('takes a second press only after the first is answered', async () => {
    let sent = 0;
    let answer: () => void = () => undefined;
    render(
      <Form
        submit={() => {
          sent += 1;
          return new Promise((resolve) => {
            answer = resolve;
          });
        }}
      />,
    );
    type('Name', 'a');
    send();
    send();
    expect(sent).toBe(1);
    await act(async () => {
      answer();
      await Promise.resolve();
    });
    send();
    expect(sent).toBe(2);
  });

  it('keeps what was typed through a reload until it is sent, and never a field that is not listed', async () => {
    const first = render(<Form submit={() => Promise.resolve()} />);
    type('Name', 'half typed');
    type('Secret', 'hush');
    first.unmount();
    expect(JSON.stringify({ ...window.sessionStorage })).not.toContain('hush');
    const second = render(<Form submit={() => Promise.resolve()} />);
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('half typed');
    send();
    await waitFor(() => {
      expect(window.sessionStorage.length).toBe(0);
    });
    second.unmount();
    render(<Form submit={() => Promise.resolve()} />);
    expect(screen.getByLabelText<HTMLInputElement>('Name').value).toBe('');
  });
});
