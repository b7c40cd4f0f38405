import { View, type ViewStyle } from 'react-native';

import { Text } from '@/components/ui/Text';

const MARKS: readonly { text: string; strong?: boolean; place: ViewStyle }[] = [
  { text: '0', place: { left: 0 } },
  { text: '50', place: { left: '33.333%', transform: [{ translateX: '-50%' }] } },
  { text: 'rating 100 %', strong: true, place: { left: '66.667%', transform: [{ translateX: '-50%' }] } },
  { text: '150', place: { right: 0 } },
];

/** The scale above a list of margin bars, in per cent of the rating. */
export const MarginRuler = () => (
  <View aria-hidden style={{ height: 15, marginTop: 2 }}>
    {MARKS.map(({ text, strong, place }) => (
      <View key={text} style={{ position: 'absolute', ...place }}>
        <Text variant="legend" tone={strong ? 'ink' : 'quiet'} strong={strong} style={{ fontSize: 12, lineHeight: 13 }}>{text}</Text>
      </View>
    ))}
  </View>
);
