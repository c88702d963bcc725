import type { Opening } from '@embertally/shared/survey/survey-document';

export const OPENING_KINDS: readonly { readonly value: Opening['kind']; readonly label: string }[] = [
  { value: 'door', label: 'Door' },
  { value: 'window', label: 'Window' },
  { value: 'vent', label: 'Vent' },
  { value: 'shutter', label: 'Shutter' },
  { value: 'gap', label: 'Gap' },
];

export const OPENING_STATES: readonly { readonly value: Opening['state']; readonly label: string }[] = [
  { value: 'open', label: 'open' },
  { value: 'fails', label: 'fails at flashover' },
  { value: 'closed', label: 'closed' },
];

/** "Stage door", or "Door" where it has no label. */
export function openingName(opening: Pick<Opening, 'kind' | 'label'>): string {
  if (opening.label !== '') return opening.label;
  return OPENING_KINDS.find((kind) => kind.value === opening.kind)?.label ?? opening.kind;
}
