import type { Me } from '@embertally/shared/contracts/sessions';
import type { BuildingSummary, Site, SiteSummary } from '@embertally/shared/contracts/sites';
import type { SiteRoleName } from '@embertally/shared/policy/policy';

/** A UUID that can be told apart by eye. */
export function uuid(number: number): string {
  return `00000000-0000-4000-8000-${String(number).padStart(12, '0')}`;
}

export const AT = '2026-11-30T10:00:00.000Z';

export function sampleMe(change: { readonly name?: string; readonly units?: 'SI' | 'US' } = {}): Me {
  return {
    person: {
      id: uuid(1),
      name: change.name ?? 'Ines Orchard',
      email: 'ines@harbourwell.example',
      units: change.units ?? 'SI',
    },
    members: [{ id: uuid(2), organisation_id: uuid(3), organisation_name: 'Harbourwell Fire Office', role: 'member' }],
    member_id: uuid(2),
    session: { expires_at: '2026-12-08T10:00:00.000Z' },
  };
}

export function sampleSiteSummary(number: number, name: string, change: Partial<SiteSummary> = {}): SiteSummary {
  return {
    id: uuid(number),
    name,
    address: '4 Saltmarsh Lane',
    time_zone: 'Europe/London',
    keeper: { id: uuid(4), name: 'Tidewater Players’ Trust' },
    my_role: 'inspector',
    of_keeper: false,
    buildings: 1,
    rooms: 14,
    rooms_over: 1,
    rooms_near: 2,
    version: 3,
    updated_at: AT,
    ...change,
  };
}

export function sampleBuilding(number: number, name: string): BuildingSummary {
  return {
    id: uuid(number),
    site_id: uuid(10),
    name,
    survey_id: uuid(number + 100),
    storeys: 2,
    rooms: 14,
    rooms_over: 1,
    rooms_near: 2,
    version: 1,
    updated_at: AT,
  };
}

export function sampleSite(change: Partial<Site> = {}): Site {
  return {
    ...sampleSiteSummary(10, 'Saltmarsh Lane Store'),
    building_list: [sampleBuilding(20, 'Main building')],
    people: [
      {
        id: uuid(40),
        member_id: uuid(50),
        name: 'Mara Tidewell',
        organisation_name: 'Tidewater Players’ Trust',
        role: 'manager' satisfies SiteRoleName,
      },
    ],
    ...change,
  };
}
