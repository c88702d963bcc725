import type { DraftOf } from '@embertally/shared/materials/material-draft';

/** A value from a sheet: net as received, so that nothing has to be worked out. */
export function supplierDraft(change: Partial<DraftOf<'supplier'>> = {}): DraftOf<'supplier'> {
  return {
    way: 'supplier',
    label: 'Stage drape',
    source: 'Sheet of the weaver, edition 3',
    heat_MJ: 20,
    per: 'kg',
    heat: 'net',
    state: 'as-received',
    range: { by: 'class', evidence: 'laboratory' },
    ...change,
  };
}

/** Methane from its enthalpy of formation. */
export function formulaDraft(change: Partial<DraftOf<'formula'>> = {}): DraftOf<'formula'> {
  return {
    way: 'formula',
    label: 'Methane',
    source: 'CRC Handbook of Chemistry and Physics',
    formula: 'CH4',
    formation_kJ_mol: -74.6,
    phase: 'gas',
    ...change,
  };
}

export function compositionDraft(parts: DraftOf<'composition'>['parts']): DraftOf<'composition'> {
  return { way: 'composition', label: 'Painted flat', source: 'Weighed in the workshop', parts };
}
