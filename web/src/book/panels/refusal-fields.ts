import type { Done, Refusal } from '@embertally/shared/survey/command';

/**
 * The refusal of a command as the error of one field of a form.
 *
 * @param fields the command's field names and the form's field each belongs to
 * @param otherwise the form's field for a refusal that names none of them
 */
export function refusalFields<K extends string>(
  result: Done | Refusal,
  fields: Readonly<Record<string, K>>,
  otherwise: K,
): Partial<Record<K, string>> {
  if (!result.refused) return {};
  const named = result.field === undefined ? undefined : fields[result.field];
  return { [named ?? otherwise]: result.message } as Partial<Record<K, string>>;
}
