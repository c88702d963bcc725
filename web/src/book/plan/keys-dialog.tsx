import { Dialog } from '../../components/dialog.tsx';
import type { Action } from '../actions/action.ts';
import { keyLabel } from '../actions/key-name.ts';
import { ALL_ACTIONS } from '../actions/plan-actions.ts';

const GROUPS: readonly { readonly group: Action['group']; readonly title: string }[] = [
  { group: 'draw', title: 'Draw and place' },
  { group: 'change', title: 'Change' },
  { group: 'look', title: 'Look' },
];
const ALWAYS = [
  ['Esc', 'Call off what is going on; then put the tool away; then pick nothing'],
  ['Alt or Ctrl held', 'Let go of snapping'],
  ['Space held, middle button, two fingers', 'Move the view'],
  ['Wheel, pinch', 'Zoom'],
  ['Arrows, then Enter', 'Point and press with a tool in hand'],
  ['[ and ]', 'Turn what is being placed by 15°, with Shift by 90°'],
] as const;

/** Every key of the plan. */
export function KeysDialog({ onClose }: { readonly onClose: () => void }) {
  return (
    <Dialog open onClose={onClose} title="Keys" width="wide" description="Keys work while the plan has the focus.">
      <div className="keys-list">
        {GROUPS.map(({ group, title }) => (
          <section key={group}>
            <h3 className="font-bold">{title}</h3>
            <dl>
              {ALL_ACTIONS.filter((action) => action.group === group).map((action) => (
                <Row key={action.id} keys={action.keys.map(keyLabel).join(' or ')} words={action.label} />
              ))}
            </dl>
          </section>
        ))}
        <section>
          <h3 className="font-bold">Always</h3>
          <dl>
            {ALWAYS.map(([keys, words]) => (
              <Row key={keys} keys={keys} words={words} />
            ))}
          </dl>
        </section>
      </div>
    </Dialog>
  );
}

function Row({ keys, words }: { readonly keys: string; readonly words: string }) {
  return (
    <div>
      <dt className="figure">{keys}</dt>
      <dd>{words}</dd>
    </div>
  );
}
