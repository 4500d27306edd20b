/** Every address of the web, by name. Route patterns in router.tsx and these must agree. */
export const paths = {
  home: () => '/',
  signIn: (to?: string) => (to && to !== '/' ? `/sign-in?to=${encodeURIComponent(to)}` : '/sign-in'),
  overview: (roundId: string) => `/rounds/${roundId}/overview`,
  candidates: (roundId: string) => `/rounds/${roundId}/candidates`,
  candidateQuotes: (roundId: string, candidateId: string) =>
    `/rounds/${roundId}/candidates/${candidateId}/quotes`,
  quotes: (roundId: string) => `/rounds/${roundId}/quotes`,
  limits: (roundId: string) => `/rounds/${roundId}/limits`,
  scoring: (roundId: string) => `/rounds/${roundId}/scoring`,
  frontier: (roundId: string) => `/rounds/${roundId}/frontier`,
  approval: (roundId: string) => `/rounds/${roundId}/approval`,
};

/** Where to go after signing in: only an address of ours, never another site's. */
export function safeTarget(to: string | null): string {
  if (!to || !/^\/(?![/\\])/u.test(to) || to.startsWith('/sign-in')) return paths.home();
  return to;
}
