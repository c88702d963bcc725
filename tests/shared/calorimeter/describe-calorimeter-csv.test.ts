import { describe, expect, it } from 'vitest';
import { calorimeterMappingSchema } from '@embertally/shared/calorimeter/calorimeter-choices';
import { describeCalorimeterCsv } from '@embertally/shared/calorimeter/describe-calorimeter-csv';
import { recallMapping, rememberMapping } from '@embertally/shared/calorimeter/mapping-memory';
import { csv, TRIANGLE } from './calorimeter-files.ts';

describe('what a file is proposed to be', () => {
  it('lists its columns with name, unit, samples and whether they are empty', () => {
    const { columns } = describeCalorimeterCsv(csv('Time (s),Mass (g),HRR in kW', '0,,1', '1,,2', '2,,3', '3,,4'));
    expect(columns).toMatchObject([
      { index: 0, name: 'Time', unit: 's', samples: ['0', '1', '2'], empty: false },
      { index: 1, name: 'Mass', unit: 'g', samples: [], empty: true },
      { index: 2, name: 'HRR', unit: 'kW', samples: ['1', '2', '3'], empty: false },
    ]);
  });

  it('proposes no empty column, no column with a unit of something else, and no more of a name than all of it', () => {
    const { proposed } = describeCalorimeterCsv(
      csv(
        'Time (s),Mass (g),CO2 (kg/kg),Quad A Oxygen 0.6 m,Wall heat release rate gauge',
        '0,,1,20.9,3',
        '1,,1,20.9,3',
        '2,,1,20.9,3',
      ),
    );
    expect(proposed.columns).toEqual({ time: 0 });
  });

  it('says what it assumed', () => {
    const { proposed, notes } = describeCalorimeterCsv(csv('Time,Heat Release Rate', ...TRIANGLE));
    expect(proposed.units).toEqual({ time: 's', rate: 'kW' });
    expect(notes).toEqual([
      '“Time” names no unit: seconds are assumed.',
      '“Heat Release Rate” names no unit: kW is assumed. Check it before you go on.',
    ]);
  });

  it('says why a column that bears the name is passed over', () => {
    const { notes } = describeCalorimeterCsv(
      csv('Time (s),HRR (kcal/h),Mass (g),CO2 (kg/kg)', '0,1,,1', '1,2,,1', '2,3,,1'),
    );
    expect(notes).toEqual([
      '“HRR” (column 2) is not proposed as heat release rate: “kcal/h” is none of kW, W, MW, kW/m2, W/m2, MW/m2.',
      '“CO2” (column 4) is not proposed as carbon dioxide: “kg/kg” is none of fraction, %, ppm.',
      '“Mass” (column 3) is not proposed as mass of the test piece: it has no readings.',
    ]);
  });

  it('reads a raised 2 that an older encoding spoilt', () => {
    const { proposed } = describeCalorimeterCsv(csv('Time (s),HRR (kW/m\uFFFD)', ...TRIANGLE));
    expect(proposed.units.rate).toBe('kW/m2');
  });

  it('offers gases where there is no rate', () => {
    const { proposed } = describeCalorimeterCsv(csv('Time (s),O2 (%),MFR (g/s)', '0,20.9,1', '1,20.9,1', '2,20.9,1'));
    expect(proposed).toMatchObject({ from: 'gases', columns: { time: 0, oxygen: 1, flow: 2 } });
  });
});

describe('a mapping kept for the next file', () => {
  const text = csv('Time (s),Total output (x),HRR (kW)', '0,1,0', '60,2,1000', '120,3,500', '180,4,0');
  const first = describeCalorimeterCsv(text);
  const choices = {
    ...first.proposed,
    columns: { time: 0, rate: 1 },
    units: { time: 's', rate: 'MW' },
  };

  it('finds its columns by their headers, wherever they stand', () => {
    const kept = calorimeterMappingSchema.parse(JSON.parse(JSON.stringify(rememberMapping(first, choices))));
    const moved = describeCalorimeterCsv(
      csv('Total output (x),Note,Time (s)', '0,1,0', '1,2,60', '0.5,3,120', '0,1,180'),
    );
    expect(recallMapping(moved, kept)).toMatchObject({
      columns: { time: 2, rate: 0 },
      units: { time: 's', rate: 'MW' },
    });
  });

  it('gives way to the proposal where a header is not there', () => {
    const other = describeCalorimeterCsv(csv('Time (s),HRR (kW)', ...TRIANGLE));
    expect(recallMapping(other, rememberMapping(first, choices))).toEqual(other.proposed);
  });
});
