import { NavLink } from 'react-router-dom';
import { paths } from '../lib/paths.ts';

const SECTIONS = [
  { label: 'Today', to: paths.today(), end: true },
  { label: 'Sites', to: paths.sites(), end: false },
  { label: 'Catalogue', to: paths.catalogue(), end: false },
  { label: 'Cautions', to: paths.cautions(), end: false },
] as const;

/** The sections of the book: tabs at the outer edge of a wide page, a strip along the bottom of a narrow one. */
export function EdgeIndex() {
  return (
    <nav aria-label="Sections" className="edge-index not-on-paper">
      {SECTIONS.map((section) => (
        <NavLink key={section.to} to={section.to} end={section.end}>
          {section.label}
        </NavLink>
      ))}
    </nav>
  );
}
