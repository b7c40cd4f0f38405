import { View } from 'react-native';

import { ButtonLink } from '@/components/ui/Button';
import { Text } from '@/components/ui/Text';

export default function NotFound() {
  return (
    <View role="main" style={{ padding: 20, gap: 12, alignItems: 'flex-start' }}>
      <Text variant="verdict" strong heading={1}>Nothing stands at this address</Text>
      <Text>It may have been moved, or the link was cut short when it was copied.</Text>
      <ButtonLink href="/" label="To the scenarios" kind="primary" />
    </View>
  );
}
