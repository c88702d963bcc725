import { Button } from '../../components/button.tsx';
import { useBook } from '../session/use-book.ts';
import { useBookSession } from '../session/use-book-session.ts';

/** The sentence that stands at the foot of the plan until the next gesture: what was refused, and a way out. */
export function PlanMessage() {
  const session = useBookSession();
  const message = useBook((state) => state.message);
  if (message === null) return null;
  const { offer } = message;
  return (
    <div className="plan-message" data-kind={message.kind} role={message.kind === 'refusal' ? 'alert' : undefined}>
      <p>{message.text}</p>
      <div className="flex gap-2">
        {offer === undefined ? null : (
          <Button size="small" onClick={offer.run}>
            {offer.label}
          </Button>
        )}
        <Button
          size="small"
          look="quiet"
          onClick={() => {
            session.say(null);
          }}
        >
          Dismiss
        </Button>
      </div>
    </div>
  );
}
