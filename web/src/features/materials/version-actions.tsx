import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '../../components/button.tsx';
import { ConfirmDialog } from '../../components/confirm-dialog.tsx';
import { LinkButton } from '../../components/link-button.tsx';
import { Notice } from '../../components/notice.tsx';
import { useStatus } from '../../components/status-region.tsx';
import { StaleError } from '../../lib/api-errors.ts';
import { paths } from '../../lib/paths.ts';
import { ToldError } from '../../lib/told-error.ts';
import type { OwnMaterialVersion } from './api/material-version.ts';
import { discardDraft, moveVersion, type Move } from './api/move-version.ts';
import { ReasonDialog } from './reason-dialog.tsx';

interface VersionActionsProps {
  readonly version: OwnMaterialVersion;
  /** Whether it is the version that is placed now. */
  readonly inForce: boolean;
}

type Asked = 'return' | 'withdraw' | 'throw away' | null;

const DONE = {
  'put-forward': 'It was put forward: another member of your organisation decides.',
  approved: 'It was approved and can be placed.',
  returned: 'It was returned to its author.',
  withdrawn: 'It was withdrawn; entries keep what they have.',
} as const satisfies Record<Move['state'], string>;

/** What can be done with a version next, and who it waits for. */
export function VersionActions({ version, inForce }: VersionActionsProps) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const announce = useStatus();
  const [asked, setAsked] = useState<Asked>(null);
  const [busy, setBusy] = useState<Move['state'] | 'discard' | null>(null);
  const [failure, setFailure] = useState<string | null>(null);
  const { state, mine } = version;
  const close = () => setAsked(null);

  const send = async (move: Move): Promise<void> => {
    try {
      await moveVersion(client, version, move);
    } catch (error) {
      if (!(error instanceof StaleError)) throw error;
      await client.invalidateQueries({ queryKey: ['own-materials'] });
      throw new ToldError('Somebody changed this material meanwhile. Look at it once more, then decide.', {
        cause: error,
      });
    }
    close();
    announce(DONE[move.state]);
  };
  const press = (doing: Move['state'] | 'discard', act: () => Promise<void>) => {
    setBusy(doing);
    setFailure(null);
    act()
      .catch((error: unknown) => {
        setFailure(error instanceof Error ? error.message : String(error));
      })
      .finally(() => {
        setBusy(null);
      });
  };
  const next = <LinkButton to={paths.nextVersion(version.material_id, version.version)}>Make a new version</LinkButton>;

  return (
    <div className="grid gap-3 pt-4">
      {failure === null ? null : (
        <Notice tone="problem" announced>
          {failure}
        </Notice>
      )}
      <p className="max-w-[60ch] text-soft">{nextStep(version, inForce)}</p>
      <div className="flex flex-wrap gap-3">
        {state === 'draft' && mine ? (
          <>
            <Button
              look="primary"
              busy={busy === 'put-forward'}
              onClick={() => {
                press('put-forward', () => send({ state: 'put-forward' }));
              }}
            >
              Put forward
            </Button>
            <LinkButton to={paths.nextVersion(version.material_id, version.version, true)}>Change the draft</LinkButton>
            <Button look="destructive" onClick={() => setAsked('throw away')}>
              Throw the draft away
            </Button>
          </>
        ) : null}
        {state === 'put-forward' && !mine ? (
          <>
            <Button
              look="primary"
              busy={busy === 'approved'}
              onClick={() => {
                press('approved', () => send({ state: 'approved' }));
              }}
            >
              Approve
            </Button>
            <Button onClick={() => setAsked('return')}>Return it</Button>
          </>
        ) : null}
        {state === 'approved' || state === 'returned' || state === 'withdrawn' ? next : null}
        {state === 'approved' && inForce ? (
          <Button look="destructive" onClick={() => setAsked('withdraw')}>
            Withdraw
          </Button>
        ) : null}
      </div>
      <ReasonDialog
        open={asked === 'return'}
        name={`return-${version.material_id}-${version.version}`}
        title="Return this version"
        description="Its author reads why and makes a new version."
        hint="What does not hold, and what would."
        verb="Return it"
        onSend={(reason) => send({ state: 'returned', reason })}
        onClose={close}
      />
      <ReasonDialog
        open={asked === 'withdraw'}
        name={`withdraw-${version.material_id}-${version.version}`}
        title="Withdraw this material"
        description="Nobody can place it any more. Entries keep the heat they were tallied with."
        hint="Everybody who opens the material reads it."
        verb="Withdraw"
        onSend={(reason) => send({ state: 'withdrawn', reason })}
        onClose={close}
      />
      <ConfirmDialog
        open={asked === 'throw away'}
        title="Throw this draft away?"
        confirm="Throw it away"
        busy={busy === 'discard'}
        onClose={close}
        onConfirm={() => {
          press('discard', async () => {
            await discardDraft(client, version);
            announce('The draft was thrown away.');
            await navigate(paths.catalogue('own'), { replace: true });
          });
        }}
      >
        <p>
          Version {version.version} of {version.label} goes, with what was typed into it. Other versions stay.
        </p>
      </ConfirmDialog>
    </div>
  );
}

function nextStep({ state, mine, author }: OwnMaterialVersion, inForce: boolean): string {
  switch (state) {
    case 'draft':
      return mine
        ? 'Nobody can place it yet. Put it forward when it is complete: from then on it never changes.'
        : `A draft of ${author}; nobody can place it yet.`;
    case 'put-forward':
      return mine
        ? 'It waits for another member of your organisation to approve it. Nobody approves a version of their own.'
        : `${author} put it forward. Read its workings and the evidence, then approve it or return it with a reason.`;
    case 'approved':
      return inForce
        ? 'This version is placed now. Another value is a new version; entries keep theirs until somebody takes it.'
        : 'A newer version is placed now. Entries that were tallied with this one keep it until somebody takes the newer.';
    case 'returned':
      return 'It did not hold. A new version can begin from it.';
    case 'withdrawn':
      return 'It is placed no longer. Entries keep what they have.';
  }
}
