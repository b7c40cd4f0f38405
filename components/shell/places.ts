import type { Href } from 'expo-router';
import type { ComponentType } from 'react';

import { PartsIcon, ScenariosIcon, TeamIcon, type IconProps } from '@/components/ui/NavIcons';

export interface Place {
  href: Href;
  label: string;
  Icon: ComponentType<IconProps>;
}

/** Every place that navigation leads to, in the order shown. */
export const PLACES: readonly Place[] = [
  { href: '/scenarios', label: 'Scenarios', Icon: ScenariosIcon },
  { href: '/parts', label: 'Parts', Icon: PartsIcon },
  { href: '/account', label: 'Account', Icon: TeamIcon },
];
