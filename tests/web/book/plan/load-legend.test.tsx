import { LoadLegend } from '@embertally/web/src/book/plan/load-legend.tsx';
import { act, screen } from '@testing-library/react';
import { expect, test } from 'vitest';
import { dock, renderBookPart } from '../../tally/render-book-part.tsx';

const edges = () => screen.getAllByRole('listitem').map((item) => item.textContent);

test('the bands are told in the units the person reads in', () => {
  const session = renderBookPart(<LoadLegend />, dock());
  expect(edges().slice(0, 3)).toEqual(['0', '200', '450']);
  expect(screen.getByText('MJ/m²')).toBeTruthy();
  act(() => {
    session.setUnits('US');
  });
  // 1 MJ/m² is 88.055 Btu/ft².
  expect(
    edges()
      .slice(0, 3)
      .map((text) => text?.replaceAll(/\s/g, '')),
  ).toEqual(['0', '17600', '39600']);
  expect(screen.getByText('Btu/ft²')).toBeTruthy();
});
