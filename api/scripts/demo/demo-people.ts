import type { SiteRoleName } from '@embertally/shared/policy/policy';

export interface DemoPerson {
  readonly name: string;
  readonly email: string;
  readonly organisation: string;
  readonly role: SiteRoleName;
}

/** Invented people of three invented organisations. The first one of an organisation signs it up. */
export const DEMO_PEOPLE: readonly DemoPerson[] = [
  {
    name: 'Tamsin Reddaway',
    email: 'tamsin@tidewater.example',
    organisation: 'Tidewater Players’ Trust',
    role: 'manager',
  },
  { name: 'Ines Okoro', email: 'ines@harbourwell.example', organisation: 'Harbourwell Fire Office', role: 'inspector' },
  { name: 'Bram Lindholm', email: 'bram@merrow.example', organisation: 'Merrow Mutual', role: 'reviewer' },
  { name: 'Wyn Castell', email: 'wyn@tidewater.example', organisation: 'Tidewater Players’ Trust', role: 'viewer' },
];

export const DEMO_SITE = {
  name: 'Saltmarsh Lane Store',
  address: '4 Saltmarsh Lane, Tidewater',
  time_zone: 'Europe/London',
};
export const DEMO_BUILDING = 'Main building';
