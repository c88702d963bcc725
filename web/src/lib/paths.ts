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
  cautions: '/cautions',
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
  catalogue: () => '/catalogue',
  cautions: () => '/cautions',
  account: () => '/account',
} as const;

/** The place to go after signing in: a path of this origin, or Today. Never another origin, never sign-in itself. */
export function nextAfterSignIn(search: string): string {
  const next = new URLSearchParams(search).get('next') ?? '';
  const ours = next.startsWith('/') && !next.startsWith('//') && !next.includes('\\');
  return ours && !next.startsWith(patterns.signIn) ? next : paths.today();
}
