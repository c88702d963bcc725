import { describe, expect, it } from 'vitest';
import { csv, faultsIn, preview, reading, TRIANGLE } from './calorimeter-files.ts';

describe('a calorimeter file', () => {
  it('gives heat, peak and time of the peak', () => {
    expect(preview(csv('Time (s),HRR (kW)', ...TRIANGLE))).toMatchObject({
      per: 'piece',
      readings: 4,
      heat_MJ: 90,
      peak: 1000,
      peak_s: 60,
      duration_s: 180,
      piece_heat_MJ: 90,
      undecided: [],
      curve: {
        per: 'piece',
        points: [
          [0, 0],
          [60, 1000],
          [120, 500],
          [180, 0],
        ],
      },
    });
  });

  it.each([
    ['semicolons and decimal commas', csv('Time (s);HRR (kW)', '0,0;0,0', '60,0;1000,0', '120,0;500,0', '180,0;0,0')],
    ['tabs', csv('Time (s)\tHRR (kW)', ...TRIANGLE.map((line) => line.replace(',', '\t')))],
    [
      'a byte order mark and Windows line ends',
      `\uFEFF${csv('Time (s),HRR (kW)', ...TRIANGLE).replaceAll('\n', '\r\n')}`,
    ],
    [
      'a line that names the delimiter',
      csv('sep=;', 'Time (s);HRR (kW)', ...TRIANGLE.map((line) => line.replace(',', ';'))),
    ],
    ['a row of names and a row of units', csv('Time,HRR', 's,kW', ...TRIANGLE)],
    ['notes above the header', csv('Laboratory report 12', 'Mass,20.8', '', 'Time (s),HRR (kW)', ...TRIANGLE)],
    [
      'quoted cells',
      csv('"Time (s)","HRR, total (kW)","HRR (kW)"', ...TRIANGLE.map((line) => `"${line.replace(',', '","x","')}"`)),
    ],
    ['minutes and megawatts', csv('Time (min),Heat release rate [MW]', '0,0', '1,1', '2,0.5', '3,0')],
    ['clock times', csv('Elapsed time (hh:mm:ss),HRR (kW)', '0:10:00,0', '0:11:00,1000', '0:12:00,500', '0:13:00,0')],
    ['watts', csv('t (s),RHR (W)', '0,0', '60,1000000', '120,500000', '180,0')],
  ])('with %s', (_name, text) => {
    expect(preview(text)).toMatchObject({ heat_MJ: 90, peak: 1000, peak_s: 60 });
  });

  it('per area stays per area, and makes a piece only with the area of the test piece', () => {
    const text = csv('Time (s),HRR (kW/m²)', ...TRIANGLE);
    expect(preview(text)).toMatchObject({ per: 'm2', heat_MJ: 90, piece_heat_MJ: null });
    expect(preview(text, { specimen_m2: 0.01 })).toMatchObject({
      per: 'm2',
      piece_heat_MJ: 0.9,
      curve: { per: 'm2', specimen_m2: 0.01 },
    });
  });

  it('reads the mass that burnt from mass or loss rate, and refuses one that makes no sense', () => {
    const lost = csv('Time (s),HRR (kW),Mass (kg)', '0,0,20', '60,1000,18', '120,500,16', '180,0,15');
    expect(preview(lost).burnt_kg).toBe(5);
    expect(preview(lost).effective_MJ_kg).toBe(18);
    const rate = csv('Time (s),HRR (kW),MLR (g/s)', '0,0,0', '60,1000,40', '120,500,20', '180,0,0');
    expect(preview(rate).burnt_kg).toBeCloseTo(3.6, 9);
    const drifting = csv('Time (s),HRR (kW),Mass (kg)', '0,0,20', '60,1000,8', '120,500,-1', '180,0,-2');
    expect(preview(drifting)).toMatchObject({ burnt_kg: null, effective_MJ_kg: null });
    const tooLittle = csv('Time (s),HRR (kW),Mass (kg)', '0,0,20', '60,1000,19.9', '120,500,19.5', '180,0,19');
    expect(preview(tooLittle).burnt_kg).toBeNull();
    expect(preview(tooLittle).notes.map(({ code }) => code)).toContain('MASS');
    expect(preview(tooLittle, { burnt_kg: 6 }).effective_MJ_kg).toBe(15);
  });

  it('leaves out what comes before time 0, and says what it held', () => {
    const text = csv('Time (s),HRR (kW)', '-20,0', '-10,0', ...TRIANGLE);
    const read = preview(text);
    expect(read).toMatchObject({ readings: 4, heat_MJ: 90, peak_s: 60 });
    expect(read.notes).toContainEqual({
      code: 'BEFORE_START',
      text: '2 readings before 0 s are left out; they hold 0 MJ.',
    });
    expect(preview(text, { start_s: 60 })).toMatchObject({ readings: 3, heat_MJ: 60, peak_s: 0 });
  });

  it('asks what to do with readings below 0, and shows what setting them to 0 adds', () => {
    const text = csv('Time (s),HRR (kW)', '0,-10', '10,0', '60,1000', '120,500', '180,0');
    const open = preview(text);
    expect(open).toMatchObject({ curve: null, undecided: ['negatives'] });
    expect(open.notes[0]).toMatchObject({ code: 'NOISE_BELOW_ZERO' });
    const decided = preview(text, { negatives: 'zero' });
    expect(decided.curve?.points[0]).toEqual([0, 0]);
    expect(decided.heat_MJ - open.heat_MJ).toBeCloseTo(0.05, 9);
    const deep = preview(csv('Time (s),HRR (kW)', '0,-400', '10,0', '60,1000', '120,500', '180,0'));
    expect(deep.notes[0]?.code).toBe('BELOW_ZERO');
  });

  it('leaves off blanks at both ends, and makes blanks in between a fault until told to pass over them', () => {
    const ends = csv('Time (s),HRR (kW)', '-5,', ...TRIANGLE, '190,', '200,');
    expect(preview(ends)).toMatchObject({ heat_MJ: 90 });
    expect(preview(ends).notes.map(({ code }) => code)).toEqual(['BLANK_START', 'BLANK_END']);
    const inside = csv('Time (s),HRR (kW)', '0,0', '30,', '60,1000', '90,n/a', '120,500', '180,0');
    expect(faultsIn(inside)).toEqual(['3 blank', '5 blank']);
    expect(preview(inside, { blanks: 'bridge' })).toMatchObject({ heat_MJ: 90, readings: 4 });
  });

  it('names lines whose time goes back or repeats, and mends them only when told', () => {
    const text = csv('Time (s),HRR (kW)', '0,0', '120,500', '60,900', '60,1100', '180,0');
    expect(faultsIn(text)).toEqual(['4 time_back', '5 time_repeated']);
    expect(preview(text, { order: 'mend' })).toMatchObject({ heat_MJ: 90, peak: 1000, peak_s: 60 });
  });

  it('names lines with text, and counts what it does not list', () => {
    expect(faultsIn(csv('Time (s),HRR (kW)', '0,0', '60,high', 'soon,500', '180,0'), {})).toEqual([
      '3 not_a_number',
      '4 not_a_number',
    ]);
    const many = csv('Time (s),HRR (kW)', '0,0', '1,1', '2,2', ...Array.from({ length: 250 }, (_, i) => `${i + 3},?`));
    const read = reading(many);
    expect(read).toMatchObject({ ok: false, moreFaults: 150 });
    expect(read.ok ? 0 : read.faults.length).toBe(100);
  });

  it('asks about 1,234 where it can be read in two ways, and not where the file tells', () => {
    const doubtful = csv('Time (s);HRR (kW)', '0;0', '60;1,234', '120;2,500', '180;0');
    expect(faultsIn(doubtful)).toEqual(['3 ambiguous', '4 ambiguous']);
    expect(preview(doubtful, { decimal: 'comma' }).peak).toBe(2.5);
    expect(preview(doubtful, { decimal: 'point' }).peak).toBe(2500);
    const told = csv('Time (s);HRR (kW)', '0;0,5', '60;1,234', '120;2,500', '180;0');
    expect(preview(told).peak).toBe(2.5);
  });

  it('refuses a file without the column, and takes no neighbour for it', () => {
    const neighbours = csv(
      'Time (s),Heat flux (kW/m2),Total heat release (MJ),Wall HRR gauge (mV)',
      '0,1,2,3',
      '1,2,3,4',
      '2,3,4,5',
    );
    expect(faultsIn(neighbours)).toEqual(['file no_rate']);
    expect(faultsIn(csv('HRR (kW)', '1', '2', '3'))).toEqual(['file no_time']);
    expect(faultsIn(csv('Time (s),HRR (kW)', ...TRIANGLE), { from: 'gases' })).toEqual(['file no_gases']);
    expect(faultsIn(csv('Time (s),HRR (kW)', ...TRIANGLE), { columns: { time: 0, rate: 0 } })).toEqual([
      'file column_twice',
    ]);
    expect(faultsIn(csv('Time (s),HRR (kW)', ...TRIANGLE), { units: { time: 's', rate: 'bhp' } })).toEqual([
      'file no_unit',
    ]);
    expect(faultsIn(csv('Time (s),HRR (kW)', ...TRIANGLE), { columns: { time: 0, rate: 7 } })[0]).toBe('2 short_line');
  });

  it.each([
    ['nothing', ''],
    ['blank lines', '\n\n\n'],
    ['a header alone', 'Time (s),HRR (kW)\n'],
    ['two readings', csv('Time (s),HRR (kW)', '0,0', '1,5')],
    ['only zeros', csv('Time (s),HRR (kW)', '0,0', '1,0', '2,0')],
    ['prose', 'This is a letter.\nIt has no figures.\n'],
    ['a picture', '\u0089PNG\u0000\u0001\u0002\n\u0000'],
    ['an open quote', 'Time (s),"HRR (kW)\n0,0\n1,1\n2,0\n'],
    ['infinities', csv('Time (s),HRR (kW)', '0,0', '1,1e999', '2,Infinity', '3,0')],
  ])('refuses %s with a sentence', (_name, text) => {
    const read = reading(text);
    expect(read.ok).toBe(false);
    if (!read.ok) for (const { message } of read.faults) expect(message).toMatch(/^.{10,}[.!?]$/);
  });
});

describe('a rate worked out from gases', () => {
  /** ISO 9705 by hand, from memory: 2.5 kg/s, 19.8 % O2, 0.85 % CO2, 0.06 % CO make 433.1 kW with 1 % water vapour. */
  const text = csv(
    'Time (s),O2 (%),CO2 (%),CO (ppm),MFR (kg/s)',
    ...[-3, -2, -1].map((t) => `${t},20.95,0.04,0,2.5`),
    '0,20.95,0.04,0,2.5',
    '10,19.8,0.85,600,2.5',
    '20,19.8,0.85,600,2.5',
    '30,20.95,0.04,0,2.5',
  );

  it('meets the published relation, with the air before the fire taken from the file', () => {
    const read = preview(text, { humidity: 0.01 });
    expect(read.peak).toBeCloseTo(433.1, 0);
    expect(read.heat_MJ).toBeCloseTo(0.4331 * 20, 2);
    expect(read.notes.map(({ code }) => code)).toContain('BASELINE');
    expect(preview(text).peak / read.peak).toBeCloseTo(1 / 0.99, 6);
  });

  it('says when the air before the fire is no air, and which line drifts', () => {
    expect(faultsIn(text.replaceAll('20.95', '0.21'))).toContain('file baseline');
    expect(faultsIn(text.replace('20,19.8,', '20,44,'))).toEqual(['7 oxygen']);
  });
});
