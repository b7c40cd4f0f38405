import { QueryClientProvider } from '@tanstack/react-query';
import { act } from '@testing-library/react-native';
import { renderRouter } from 'expo-router/testing-library';
import type { ComponentType, ReactNode } from 'react';

import { ThemeProvider } from '@/components/ui/theme';
import { makeQueryClient } from '@/hooks/api/query-client';
import type { Session } from '@/shared/contracts/session';

export const DESIGNER: Session = {
  user: { id: '0b6e3f8e-51b7-4a53-8c19-2a7d54c0e101', name: 'Ines Tvarro', initials: 'IT', email: 'designer@ninebar.example', roles: ['designer'] },
  team: { id: '6c1f0a52-3d0e-4b8e-9a61-0f5f2d7c9b01', name: 'Ninebar Power (demo)' },
};
export const REVIEWER: Session = { ...DESIGNER, user: { ...DESIGNER.user, name: 'Palesa Drumm', roles: ['reviewer'] } };

type Routes = Record<string, ComponentType>;

/** Opens an address among these routes, with everything around them that the app has. */
export const open = (routes: Routes, initialUrl: string) => {
  const queries = makeQueryClient();
  const wrapper = ({ children }: { children: ReactNode }) => (
    <ThemeProvider>
      <QueryClientProvider client={queries}>{children}</QueryClientProvider>
    </ThemeProvider>
  );
  return renderRouter(routes, { initialUrl, wrapper });
};

const SLICE_MS = 50;

/** Lets time go by in slices, each drawn before the next: timers fire, and what they set off settles. */
export const pass = async (milliseconds: number) => {
  for (let gone = 0; gone < milliseconds; gone += SLICE_MS) await act(async () => jest.advanceTimersByTimeAsync(SLICE_MS));
};
