import type { Clash } from '@embertally/shared/survey/change';
import { dateWords } from '../../lib/date-words.ts';
import { clashValue } from './clash-value.ts';

/** Both sides of a clash, field by field: what it was, what they made of it and when, what this person made of it. */
export function ClashTable({ clashes }: { readonly clashes: readonly Clash[] }) {
  const rows = clashes.filter((clash) => clash.reason === 'field');
  if (rows.length === 0) return null;
  return (
    <table className="ledger">
      <caption className="unseen">Both values</caption>
      <thead>
        <tr>
          <th scope="col">What</th>
          <th scope="col">It was</th>
          <th scope="col">Theirs</th>
          <th scope="col">Mine</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((clash) => (
          <tr key={`${clash.id} ${clash.field}`}>
            <th scope="row">{(clash.field ?? clash.kind).replaceAll('_', ' ')}</th>
            <td>{clashValue(clash.base)}</td>
            <td>
              {clashValue(clash.theirs)}
              <span className="block text-small text-soft">{whoAndWhen(clash)}</span>
            </td>
            <td>{clashValue(clash.mine)}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function whoAndWhen({ by, at }: Clash): string {
  const when = at === null ? '' : dateWords(at, 'moment');
  return [by, when].filter((part) => part !== null && part !== '').join(', ');
}
