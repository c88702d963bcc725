import { describe, expect, it } from 'vitest';
import { typeset } from '../../../../api/src/reports/pages/typeset.ts';

describe('typeset', () => {
  it.each([
    ['floor up to about 150 m2, not above 500 m2', 'floor up to about 150 m², not above 500 m²'],
    ['A_T/(A √H) from 9 to 65 m-1/2', 'A_T/(A √H) from 9 to 65 m^−½'],
    ['0.02 m1/2; 7.4 m5/2; 12 m3', '0.02 m^½; 7.4 m^5/2; 12 m³'],
    ['535.8 MJ/m2 and 0.04 kW/s2', '535.8 MJ/m² and 0.04 kW/s²'],
    ['option plateau_kW_m2 and room m21', 'option plateau_kW_m2 and room m21'],
  ])('%s', (text, expected) => {
    expect(typeset(text)).toBe(expected);
  });
});
