/** Route patterns, as the router reads them. The only place with addresses of screens. */
export const patterns = {
  today: '/',
  signIn: '/sign-in',
  signUp: '/sign-up',
  sites: '/sites',
  newSite: '/sites/new',
  site: '/sites/:siteId',
  survey: '/surveys/:surveyId',
  workings: '/surveys/:surveyId/rooms/:roomId/workings',
  catalogue: '/catalogue',
  newMaterial: '/catalogue/materials/new',
  material: '/catalogue/materials/:materialId',
  cautions: '/cautions',
  methods: '/methods',
  account: '/account',
} as const;

/** Addresses of screens, filled in. */
export const paths = {
  today: () => '/',
  /** `next`: where to go once signed in; ignored unless it is a path of ours. */
  signIn: (next?: string) =>
    next === undefined || next === '/' ? '/sign-in' : `/sign-in?${new URLSearchParams({ next }).toString()}`,
  signUp: () => '/sign-up',
  sites: () => '/sites',
  newSite: () => '/sites/new',
  site: (siteId: string) => `/sites/${encodeURIComponent(siteId)}`,
  survey: (surveyId: string) => `/surveys/${encodeURIComponent(surveyId)}`,
  workings: (surveyId: string, roomId: string) =>
    `/surveys/${encodeURIComponent(surveyId)}/rooms/${encodeURIComponent(roomId)}/workings`,
  catalogue: (list?: 'own' | 'kinds') => (list === undefined ? '/catalogue' : `/catalogue?list=${list}`),
  /** `way`: what its heat is known from; asked first where it is not said. */
  newMaterial: (way?: string) =>
    way === undefined ? '/catalogue/materials/new' : `/catalogue/materials/new?way=${encodeURIComponent(way)}`,
  /** The next version of a material, begun from one that is there; `edit`: that version itself, a draft of one's own. */
  nextVersion: (materialId: string, version: number, edit = false) =>
    `/catalogue/materials/new?of=${encodeURIComponent(materialId)}&${edit ? 'edit' : 'from'}=${version}`,
  /** Key of a built-in material or id of an own one; `version`: not the one that was made last. */
  material: (key: string, version?: number) =>
    `/catalogue/materials/${encodeURIComponent(key)}${version === undefined ? '' : `?version=${version}`}`,
  cautions: () => '/cautions',
  methods: () => '/methods',
  account: () => '/account',
} as const;

/** The place to go after signing in: a path of this origin, or Today. Never another origin, never sign-in itself. */
export function nextAfterSignIn(search: string): string {
  const next = new URLSearchParams(search).get('next') ?? '';
  const ours = next.startsWith('/') && !next.startsWith('//') && !next.includes('\\');
  return ours && !next.startsWith(patterns.signIn) ? next : paths.today();
}
