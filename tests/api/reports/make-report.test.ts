import { CAUTIONS } from '@embertally/shared/cautions/cautions';
import { roomInput } from '@embertally/shared/survey/room-input';
import { estimateRoom } from '@embertally/shared/tally/estimate-room';
import { formatQuantity } from '@embertally/shared/units/format-quantity';
import { beforeAll, describe, expect, it } from 'vitest';
import { RoomGoneError } from '../../../api/src/reports/build-report-book.ts';
import { makeReport } from '../../../api/src/reports/make-report.ts';
import { inkShare, pageImages, pageTexts, pdfFacts, pdfFonts } from '../../support/poppler.ts';
import { groundFloor, uid } from '../../support/survey-builder.ts';
import { sampleDocument, sampleInput } from './sample-report.ts';

/** One space for any run of spaces, so that columns can be read as sentences. */
const plain = (text: string) => text.replace(/\s+/gu, ' ');

describe('the report of a survey', () => {
  const document = sampleDocument();
  const input = sampleInput(document);
  const tallies = [...document.rooms.values()].map((room) => ({
    name: room.name,
    tally: estimateRoom(roomInput(document, room.id, input.limits)),
  }));
  let pdf: Uint8Array;
  let pages: string[];
  let text: string;
  const page = (section: string) => pages.filter((one) => plain(one).includes(section)).map(plain);
  const quantity = (value: number, unit: string) => {
    const shown = formatQuantity(value, unit, 'SI');
    return plain(`${shown.text} ${shown.unit}`);
  };

  beforeAll(async () => {
    pdf = await makeReport(input);
    pages = pageTexts(pdf);
    text = plain(pages.join(' '));
  });

  it('prints for every room the density and the heat the tally gives', () => {
    for (const { name, tally } of tallies) {
      const tallyPages = page(`Tally · ${name}`).join(' ');
      const density = tally.load.perFloor?.value;
      expect(density, name).not.toBeNull();
      expect(tallyPages, name).toContain(quantity(density ?? NaN, 'MJ/m2'));
      if ((tally.load.total.value ?? 0) === 0) continue;
      const total = plain(formatQuantity(tally.load.total.value ?? NaN, 'MJ', 'SI').text);
      expect(tallyPages, name).toContain(`Heat kept in this room ${total}`);
    }
  });

  it('lists every room in the room table with the page its tally is on', () => {
    const [table = ''] = pages.filter((one) => /Rooms\n/u.test(one) && one.includes('Equivalent time'));
    for (const { name } of tallies) {
      const row = table.split('\n').find((line) => line.includes(` ${name} `)) ?? '';
      const turnTo = Number(/(\d+)\s*$/u.exec(row)?.[1]);
      expect(plain(pages[turnTo - 1] ?? ''), name).toContain(`Tally · ${name} ${name}`);
    }
  });

  it('says how rooms stand against limits that a named person set, and calls nothing safe', () => {
    const dock = tallies.find(({ name }) => name === 'Scenery dock')?.tally.load.perFloor?.value ?? NaN;
    const percent = Math.round((dock / 420) * 100);
    expect(dock).toBeGreaterThan(420);
    const sentence = `${percent} % of the permit’s 420 MJ/m², Harbourwell Fire Office, permit 12/7, March 2026`;
    expect(page('Tally · Scenery dock').join(' ')).toContain(`over ${sentence}`);
    expect(plain(pages[0] ?? '')).toContain(`Scenery dock: ${sentence}`);
    expect(page('Tally · Corridor').join(' ')).toContain('No limit is set for this room.');
    expect(text).not.toMatch(/\b(un)?safe(ly)?\b/iu);
  });

  it('derives every number: method with version, source and inputs with their origin', () => {
    const workings = page('Workings · Scenery dock').join(' ');
    for (const method of ['load.per-floor@1', 'load.as-kept@1', 'growth.coefficient@1'])
      expect(workings).toContain(method);
    const area = tallies.find(({ name }) => name === 'Scenery dock')?.tally.room.floorArea.value ?? NaN;
    expect(workings).toMatch(new RegExp(`A_f ${area.toPrecision(5).replace(/\.?0+$/u, '')} m² .*computed`, 'u'));
    expect(workings).toContain('Source: EN 1991-1-2');
  });

  it('carries the caution line, the mark of an unissued survey and its number on every page', () => {
    for (const [index, one] of pages.entries()) {
      expect(plain(one)).toContain(
        'They do not replace the local fire code, the authority having jurisdiction or licensed practice.',
      );
      expect(plain(one)).toContain('Working survey, not issued');
      expect(plain(one)).toContain(`page ${index + 1} of ${pages.length}`);
    }
  });

  it('prints all eight cautions in full, once', () => {
    expect(CAUTIONS).toHaveLength(8);
    // A line may break after a hyphen inside a word, so spaces do not count.
    const bare = (some: string) => some.replace(/\s/gu, '');
    for (const { text: caution } of CAUTIONS) expect(bare(text).split(bare(caution)), caution).toHaveLength(2);
  });

  it('leaves no page blank and draws on every one', () => {
    const images = pageImages(pdf, 40);
    expect(images).toHaveLength(pages.length);
    for (const [index, image] of images.entries())
      expect(inkShare(image, 200), `page ${index + 1}`).toBeGreaterThan(0.003);
  });

  it('embeds every font as a subset with its letters', () => {
    const fonts = pdfFonts(pdf);
    expect(fonts.some(({ name }) => name.includes('AtkinsonHyperlegible'))).toBe(true);
    for (const font of fonts) expect(font).toMatchObject({ embedded: true, subset: false, unicode: true });
  });

  it('names title, author and moment, on A4', () => {
    const facts = pdfFacts(pdf);
    expect(facts.get('Title')).toBe('Main building – Saltmarsh Lane Store');
    expect(facts.get('Author')).toBe('Ines Marlow');
    expect(facts.get('CreationDate')).toBe('2026-12-01T14:32:00Z');
    expect(facts.get('Page size')).toContain('A4');
    expect(Buffer.from(pdf).toString('latin1')).toContain('%PDF-1.7');
  });

  it('gives the same bytes for the same input and others for another moment', async () => {
    expect(Buffer.compare(Buffer.from(pdf), Buffer.from(await makeReport(input)))).toBe(0);
    const later = await makeReport({ ...input, made_at: '2026-12-01T14:33:00Z' });
    expect(Buffer.compare(Buffer.from(pdf), Buffer.from(later))).not.toBe(0);
  });

  it('tells how far it is, from 0 to 1 and never back', async () => {
    const seen: number[] = [];
    await makeReport(input, (fraction) => seen.push(fraction));
    expect(seen[0]).toBe(0);
    expect(seen.at(-1)).toBe(1);
    expect(seen).toEqual([...seen].sort((a, b) => a - b));
    expect(seen.length).toBeGreaterThan(tallies.length);
  });

  it('writes US customary units where they are asked for', async () => {
    const us = plain(pageTexts(await makeReport({ ...input, units: 'US' })).join(' '));
    const density = tallies.find(({ name }) => name === 'Workshop')?.tally.load.perFloor?.value ?? NaN;
    // 1 MJ/m² = 1e6 / 1055.05585262 × 0.3048² Btu/ft²
    const converted = ((density * 1e6) / 1055.05585262) * 0.3048 ** 2;
    const shown = Number(converted.toPrecision(3)).toLocaleString('en-GB').replace(',', ' ');
    expect(us).toContain(`${shown} Btu/ft²`);
  });
});

describe('the tally of one room', () => {
  it('holds that room only, with its workings and the cautions', async () => {
    const pdf = await makeReport(sampleInput(undefined, { kind: 'room-tally', room_id: uid('Archive') }));
    const text = plain(pageTexts(pdf).join(' '));
    expect(text).toContain('Tally · Archive');
    expect(text).toContain('Workings: Archive');
    expect(text).not.toContain('Scenery dock');
    expect(text).toContain('Working survey, not issued');
  });

  it('says so when the room is gone', async () => {
    const gone = sampleInput(undefined, { kind: 'room-tally', room_id: uid('nowhere') });
    await expect(makeReport(gone)).rejects.toThrow(RoomGoneError);
  });
});

describe('a survey with little in it', () => {
  it('is reported without rooms', async () => {
    const pages = pageTexts(await makeReport(sampleInput(groundFloor(), { limits: [] })));
    expect(plain(pages[0] ?? '')).toContain('No room has been drawn yet');
    expect(pages.length).toBeLessThanOrEqual(4);
  });

  it('is reported without storeys', async () => {
    const bare = { ...groundFloor(), storeys: new Map() };
    expect(pageTexts(await makeReport(sampleInput(bare, { limits: [] }))).length).toBeGreaterThan(0);
  });

  it('names what is missing where nothing is recorded and nothing opens', async () => {
    const pdf = await makeReport(sampleInput(undefined, { kind: 'room-tally', room_id: uid('Prop loft') }));
    const text = plain(pageTexts(pdf).join(' '));
    expect(text).toContain('What could not be computed');
    const empty = await makeReport(sampleInput(undefined, { kind: 'room-tally', room_id: uid('Corridor') }));
    expect(plain(pageTexts(empty).join(' '))).toContain('Nothing has been recorded in this room.');
  });
});
