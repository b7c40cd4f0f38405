/** Paths of the API, one place for both sides. */
export const API = {
  session: '/api/session',
  tokens: '/api/tokens',
  token: (id: string) => `/api/tokens/${id}`,
  scenarios: '/api/scenarios',
  scenario: (id: string) => `/api/scenarios/${id}`,
  parts: '/api/parts',
  part: (id: string) => `/api/parts/${id}`,
  simulations: '/api/simulations',
  health: '/api/health',
  openapi: '/api/openapi.json',
  docs: '/api/docs',
} as const;
