import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { Dialog } from '../../components/dialog.tsx';
import type { HeldSet } from '../session/saving-status.ts';
import { useBook } from '../session/use-book.ts';
import { ClashTable } from './clash-table.tsx';
import { saveUnsent } from './save-unsent.ts';
import type { SurveySync } from './survey-sync.ts';

/** Every change the server would not take, with both sides and the choice. Nothing is decided by closing it. */
export function AttentionDialog({ sync, onClose }: { readonly sync: SurveySync; readonly onClose: () => void }) {
  const held = useBook((state) => state.saving.held);
  return (
    <Dialog
      open
      onClose={onClose}
      width="wide"
      title={held.length === 0 ? 'All settled' : 'Changes that need you'}
      description={
        held.length === 0
          ? 'Nothing waits for a choice any more.'
          : 'These changes are kept on this device and shown on your plan. The server has not taken them.'
      }
    >
      {held.map((set) => (
        <HeldChange key={set.id} set={set} sync={sync} />
      ))}
      {held.length === 0 ? null : (
        <div>
          <Button
            look="quiet"
            onClick={() => {
              saveUnsent(sync.unsent());
            }}
          >
            Save all unsent changes as a file
          </Button>
        </div>
      )}
    </Dialog>
  );
}

function HeldChange({ set, sync }: { readonly set: HeldSet; readonly sync: SurveySync }) {
  const [busy, setBusy] = useState(false);
  const clash = set.clashes.length > 0;
  const choose = (side: 'keepMine' | 'takeTheirs') => {
    setBusy(true);
    void sync[side](set.id).finally(() => {
      setBusy(false);
    });
  };
  return (
    <section className="held-change">
      <h3 className="font-bold">{set.label}</h3>
      <p>{clash ? [...new Set(set.clashes.map((item) => item.message))].join(' ') : set.reason}</p>
      {clash ? <ClashTable clashes={set.clashes} /> : null}
      {set.waiting === 0 ? null : (
        <p className="text-small text-soft">
          {set.waiting} later {set.waiting === 1 ? 'change builds' : 'changes build'} on this and{' '}
          {set.waiting === 1 ? 'waits' : 'wait'} with it.
        </p>
      )}
      <div className="flex flex-wrap gap-2">
        <Button
          busy={busy}
          onClick={() => {
            choose('keepMine');
          }}
        >
          {clash ? 'Keep mine' : 'Send again'}
        </Button>
        <Button
          busy={busy}
          onClick={() => {
            choose('takeTheirs');
          }}
        >
          {clash ? 'Take theirs' : 'Let go of this change'}
        </Button>
      </div>
    </section>
  );
}
