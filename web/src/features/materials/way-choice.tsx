import { Link } from 'react-router-dom';
import { paths } from '../../lib/paths.ts';
import { WAY_WORDS, WAYS } from './way-words.ts';

/** The first question of a new material: what is its heat known from. */
export function WayChoice() {
  return (
    <ul className="border-t border-rule">
      {WAYS.map((way) => (
        <li key={way} className="border-b border-rule">
          <Link to={paths.newMaterial(way)} className="group block py-3 text-ink no-underline">
            <span className="block font-bold text-verdigris group-hover:underline">{WAY_WORDS[way].title}</span>
            <span className="block max-w-[64ch] text-soft">{WAY_WORDS[way].hint}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}
