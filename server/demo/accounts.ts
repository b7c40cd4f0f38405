import type { DemoAccount } from './types';

/** Team, people and password are invented. */
export const DEMO_TEAM = { id: '6c1f0a52-3d0e-4b8e-9a61-0f5f2d7c9b01', name: 'Ninebar Power (demo)' } as const;

/** The same for all five; printed at start, so good for nothing but a demonstration. */
export const DEMO_PASSWORD = 'quiet-estuary-lamp';

export const DEMO_ACCOUNTS: readonly DemoAccount[] = [
  { id: '0b6e3f8e-51b7-4a53-8c19-2a7d54c0e101', name: 'Ines Tvarro', email: 'designer@ninebar.example', roles: ['designer'] },
  { id: '0b6e3f8e-51b7-4a53-8c19-2a7d54c0e102', name: 'Tobren Askelund', email: 'librarian@ninebar.example', roles: ['librarian'] },
  { id: '0b6e3f8e-51b7-4a53-8c19-2a7d54c0e103', name: 'Maridel Quost', email: 'tester@ninebar.example', roles: ['test-engineer', 'designer'] },
  { id: '0b6e3f8e-51b7-4a53-8c19-2a7d54c0e104', name: 'Palesa Drumm', email: 'reviewer@ninebar.example', roles: ['reviewer'] },
  { id: '0b6e3f8e-51b7-4a53-8c19-2a7d54c0e105', name: 'Osvin Tarrabeck', email: 'admin@ninebar.example', roles: ['admin', 'librarian'] },
];
