import { Fragment } from 'react';

/** An exponent behind a letter: `2`, `-1/2`, `^½`. */
const EXPONENT = /(?<=[A-Za-z°])(\^?[-−]?(?:\d+\/\d+|\d+|½))/;

/** A unit with its exponents raised: `m^½`, `J/m2s1/2K`. */
export function UnitText({ unit }: { readonly unit: string }) {
  return (
    <>
      {unit
        .split(EXPONENT)
        .map((piece, index) =>
          index % 2 === 0 ? (
            <Fragment key={index}>{piece}</Fragment>
          ) : (
            <sup key={index}>{piece.replace('^', '').replace('1/2', '½').replace('-', '−')}</sup>
          ),
        )}
    </>
  );
}
