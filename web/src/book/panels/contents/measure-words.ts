import type { MeasureBy } from '@embertally/shared/catalogue/catalogue-row';

/** How the amount of a kind is asked where it is not counted by the piece. */
export const MEASURE_WORDS: Readonly<
  Record<Exclude<MeasureBy, 'pieces'>, { readonly label: string; readonly unit: string }>
> = {
  'shelf metres': { label: 'Length of shelf', unit: 'm' },
  'running metres': { label: 'Running length', unit: 'm' },
  'stack height': { label: 'Stack height', unit: 'm' },
  litres: { label: 'Volume', unit: 'L' },
  volume: { label: 'Volume', unit: 'm3' },
  area: { label: 'Floor area', unit: 'm2' },
  'kilowatt-hours': { label: 'Capacity', unit: 'kWh' },
};
