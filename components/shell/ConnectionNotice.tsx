import { View } from 'react-native';

import { Notice } from '@/components/ui/Notice';
import { askHealth } from '@/hooks/api/client';
import { useLostSince } from '@/hooks/api/connection';

const clock = (at: number) => new Date(at).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });

/** Stands above every page while the server does not answer. */
export const ConnectionNotice = () => {
  const lostSince = useLostSince();
  if (lostSince === null) return null;
  return (
    <View style={{ padding: 8 }}>
      <Notice kind="offline" title="Not connected" action={{ label: 'Retry', onPress: () => void askHealth() }}>
        Since {clock(lostSince)}. Edits are kept in this browser and sent when the server answers again.
      </Notice>
    </View>
  );
};
