export type ReadCount =
  { readonly ok: true; readonly value: number } | { readonly ok: false; readonly message: string };

/** Reads a number of pieces: "3", "2,5", "2.5". Anything else is refused with what to write. */
export function readCount(typed: string): ReadCount {
  const text = typed.trim().replace(/\s/g, '');
  if (text === '') return { ok: false, message: 'Enter the count' };
  if (/^\d{1,3}[.,]\d{3}$/.test(text))
    return { ok: false, message: `Does “${typed.trim()}” mean thousands or decimals? Enter it without the separator.` };
  if (!/^\d+([.,]\d+)?$/.test(text)) return { ok: false, message: 'Count must be a number, like 3' };
  return { ok: true, value: Number(text.replace(',', '.')) };
}
