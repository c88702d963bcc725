import type { Me } from '@embertally/shared/contracts/sessions';
import { Link } from 'react-router-dom';
import { FlyOut } from '../../components/fly-out.tsx';
import { paths } from '../../lib/paths.ts';
import { initials } from './initials.ts';

interface PersonMenuProps {
  readonly me: Me;
  readonly onSignOut: () => void;
}

/** Who is signed in, for whom, and the way out. */
export function PersonMenu({ me, onSignOut }: PersonMenuProps) {
  const acting = me.members.find((member) => member.id === me.member_id);
  return (
    <FlyOut
      label={`${me.person.name}: account and sign out`}
      button={<span className="initials">{initials(me.person.name)}</span>}
    >
      <div className="border-b border-rule px-2.5 pt-1 pb-2">
        <p className="font-bold">{me.person.name}</p>
        <p className="text-small text-soft">{acting?.organisation_name ?? me.person.email}</p>
      </div>
      <Link to={paths.account()} className="menu-item mt-1">
        Account
      </Link>
      <button type="button" className="menu-item w-full" onClick={onSignOut}>
        Sign out
      </button>
    </FlyOut>
  );
}
