import { editMe, readCurrentSession, signOut } from '@embertally/shared/contracts/sessions';
import { fireEvent, screen, waitFor } from '@testing-library/react';
import { beforeEach, describe, expect, it } from 'vitest';
import { fakeServer, type FakeServer } from '../../support/fake-server.ts';
import { renderApp } from '../../support/render-app.tsx';
import { sampleMe } from '../../support/web-samples.ts';

let server: FakeServer;
beforeEach(() => {
  server = fakeServer();
  server.answer(readCurrentSession, {}, sampleMe());
});

describe('the account page', () => {
  it('saves the name and the units', async () => {
    server.answer(editMe, {}, sampleMe({ name: 'Ines O. Orchard', units: 'US' }));
    renderApp('/account');
    fireEvent.change(await screen.findByLabelText('Your name'), { target: { value: ' Ines O. Orchard ' } });
    fireEvent.click(screen.getByRole('radio', { name: /US customary/ }));
    fireEvent.click(screen.getByRole('button', { name: 'Save' }));
    await screen.findByText('Your name and units are saved.');
    expect(server.requests.at(-1)?.body).toEqual({ name: 'Ines O. Orchard', units: 'US' });
  });

  it('puts a theme on at once and remembers it', async () => {
    renderApp('/account');
    fireEvent.click(await screen.findByRole('radio', { name: /^Field/ }));
    expect(document.documentElement.dataset.theme).toBe('field');
    expect(window.localStorage.getItem('embertally.theme')).toBe('field');
    fireEvent.click(screen.getByRole('radio', { name: 'As this device is set' }));
    expect(document.documentElement.dataset.theme).toBeUndefined();
  });

  it('signs out on the server and forgets the person', async () => {
    server.answer(signOut, {}, undefined);
    const app = renderApp('/account');
    fireEvent.click((await screen.findAllByRole('button', { name: 'Sign out' })).at(-1) as HTMLElement);
    await screen.findByRole('heading', { name: 'Sign in', level: 1 });
    expect(app.path()).toBe('/sign-in');
    expect(server.requests.at(-1)?.method).toBe('DELETE');
    await waitFor(() => {
      expect(screen.queryByText('Ines Orchard')).toBeNull();
    });
  });
});
