import type { Site } from '@embertally/shared/contracts/sites';
import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { ConfirmDialog } from '../../components/confirm-dialog.tsx';
import { Notice } from '../../components/notice.tsx';
import { useStatus } from '../../components/status-region.tsx';
import { takeSiteRole } from './api/take-site-role.ts';

type Person = Site['people'][number];

interface PeopleListProps {
  readonly siteId: string;
  readonly people: readonly Person[];
  /** Whether the person looking may take roles away. */
  readonly mayTake: boolean;
}

/** Who has which role on a site. */
export function PeopleList({ siteId, people, mayTake }: PeopleListProps) {
  const client = useQueryClient();
  const announce = useStatus();
  const [asked, setAsked] = useState<Person | null>(null);
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  const take = async (person: Person) => {
    setBusy(true);
    try {
      await takeSiteRole(client, siteId, person.id);
      announce(`${person.name} is no longer ${person.role} here.`);
      setProblem(null);
    } catch (error) {
      setProblem(error instanceof Error ? error.message : 'The role could not be taken away. Nothing was changed.');
    } finally {
      setBusy(false);
      setAsked(null);
    }
  };

  return (
    <>
      {problem === null ? null : (
        <div className="mt-3">
          <Notice tone="problem" title="The role was not taken away" announced>
            {problem}
          </Notice>
        </div>
      )}
      <ul>
        {people.map((person) => (
          <li
            key={person.id}
            className="flex flex-wrap items-baseline justify-between gap-x-4 border-b border-rule py-2.5"
          >
            <div className="min-w-0">
              <p className="font-bold">{person.name}</p>
              <p className="text-small text-soft">{person.organisation_name}</p>
            </div>
            <div className="flex items-baseline gap-3">
              <span>{person.role}</span>
              {mayTake ? (
                <Button
                  look="quiet"
                  onClick={() => {
                    setAsked(person);
                  }}
                >
                  Take away{' '}
                  <span className="unseen">
                    the role {person.role} from {person.name}
                  </span>
                </Button>
              ) : null}
            </div>
          </li>
        ))}
      </ul>
      <ConfirmDialog
        open={asked !== null}
        title={`Take the role from ${asked?.name ?? ''}`}
        confirm="Take the role away"
        busy={busy}
        onClose={() => {
          setAsked(null);
        }}
        onConfirm={() => {
          if (asked !== null) void take(asked);
        }}
      >
        <p>
          {asked?.name} of {asked?.organisation_name} will no longer see this site. What they recorded and signed keeps
          their name.
        </p>
      </ConfirmDialog>
    </>
  );
}
