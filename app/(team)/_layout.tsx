import { Slot } from 'expo-router';

import { Guard } from '@/components/session/Guard';
import { TeamFrame } from '@/components/shell/TeamFrame';

export default function TeamLayout() {
  return (
    <TeamFrame>
      <Guard>
        <Slot />
      </Guard>
    </TeamFrame>
  );
}
