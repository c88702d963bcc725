import { Fragment, type ReactNode } from 'react';

/** An index behind a symbol (`q_f,k`), or a power (`t^0.5`, `e^(−0.32 t)`). */
const INDEX_OR_POWER = /_([\p{L}\p{N}]+(?:,[\p{L}\p{N}]+)*)|\^(\([^)]*\)|[-−]?[\p{L}\p{N}.½]+)/gu;

/** A symbol or a relation as text, with indices lowered and powers raised. */
export function FormulaText({ children }: { readonly children: string }) {
  const pieces: ReactNode[] = [];
  let end = 0;
  for (const match of children.matchAll(INDEX_OR_POWER)) {
    pieces.push(<Fragment key={`text ${end}`}>{children.slice(end, match.index)}</Fragment>);
    pieces.push(
      match[1] === undefined ? (
        <sup key={match.index}>{match[2]?.replace(/^\((.*)\)$/, '$1')}</sup>
      ) : (
        <sub key={match.index}>{match[1]}</sub>
      ),
    );
    end = match.index + match[0].length;
  }
  pieces.push(<Fragment key={`text ${end}`}>{children.slice(end)}</Fragment>);
  return <>{pieces}</>;
}
