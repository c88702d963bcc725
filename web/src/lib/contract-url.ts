import type { Contract } from '@embertally/shared/contracts/contract';

type Value = string | number | boolean | undefined;

/**
 * The address of one operation: path parameters filled in and percent-encoded, query fields that are set appended in
 * the order given. Throws when a parameter of the path has no value: an address with a hole in it is never asked for.
 */
export function contractUrl(
  contract: Pick<Contract, 'id' | 'path'>,
  params: Readonly<Record<string, Value>> = {},
  query: Readonly<Record<string, Value>> = {},
): string {
  const path = contract.path.replace(/:([A-Za-z]+)/g, (_whole, name: string) => {
    const value = params[name];
    if (value === undefined || value === '') throw new Error(`${contract.id} needs the path parameter ${name}`);
    return encodeURIComponent(String(value));
  });
  const search = new URLSearchParams();
  for (const [name, value] of Object.entries(query)) if (value !== undefined) search.set(name, String(value));
  const text = search.toString();
  return text === '' ? path : `${path}?${text}`;
}
