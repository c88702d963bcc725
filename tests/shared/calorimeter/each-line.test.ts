import { describe, expect, it } from 'vitest';
import { cellNumber, clockSeconds } from '@embertally/shared/calorimeter/cell-number';
import { eachLine } from '@embertally/shared/calorimeter/each-line';
import { splitCells } from '@embertally/shared/calorimeter/split-cells';

const linesOf = (text: string) => {
  const lines: (readonly [number, string])[] = [];
  eachLine(text, (line, number) => {
    lines.push([number, line]);
    return true;
  });
  return lines;
};

describe('the lines of a file', () => {
  it('are numbered as an editor shows them, whatever ends them', () => {
    expect(linesOf('\uFEFFa\r\nb\n\nc')).toEqual([
      [1, 'a'],
      [2, 'b'],
      [3, ''],
      [4, 'c'],
    ]);
  });

  it('keep a line break inside quotes, and count it', () => {
    expect(linesOf('"a\nb",c\nd')).toEqual([
      [1, '"a\nb",c'],
      [3, 'd'],
    ]);
  });

  it('stop when they are told to', () => {
    let seen = 0;
    eachLine('a\nb\nc', () => (seen += 1) < 2);
    expect(seen).toBe(2);
  });
});

describe('the cells of a line', () => {
  it.each([
    ['a, b ,c', ['a', 'b', 'c']],
    ['"a,b",c', ['a,b', 'c']],
    ['"say ""so""",', ['say "so"', '']],
    ['', ['']],
  ])('%s', (line, cells) => expect(splitCells(line, ',')).toEqual(cells));
});

describe('a cell as a number', () => {
  it.each([
    ['12.5', null, 12.5],
    ['-1.29e-06', null, -1.29e-6],
    ['.5', null, 0.5],
    ['12,5', null, 12.5],
    ['1 200,5', 'comma', 1200.5],
    ['1,234', null, 'ambiguous'],
    ['1,234', 'comma', 1.234],
    ['1,234', 'point', 1234],
    ['1.234', 'comma', 1234],
    ['', null, 'blank'],
    ['NaN', null, 'blank'],
    ['---', null, 'blank'],
    ['1e999', null, 'text'],
    ['0x10', null, 'text'],
    ['12 kW', null, 'text'],
  ] as const)('%s with %s', (cell, decimal, value) => expect(cellNumber(cell, decimal)).toBe(value));

  it.each([
    ['0:07:20', 440],
    ['07:20', 440],
    ['-00:02:00', -120],
    ['1:00:00.5', 3600.5],
    ['7', undefined],
    ['2018-12-14 15:51:00', undefined],
  ])('%s as a clock', (cell, seconds) => expect(clockSeconds(cell)).toBe(seconds));
});
