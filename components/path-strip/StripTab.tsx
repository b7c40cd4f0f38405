import { Pressable, View } from 'react-native';

import { StatusMark } from '@/components/ui/Marks';
import { BoltIcon } from '@/components/ui/NavIcons';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import { STATUS_COLOR } from '@/components/ui/tokens';

import { PathSymbol } from './PathSymbol';
import type { StripBlock, StripLine, StripMark } from './strip-block';

interface StripTabProps {
  id: string;
  block: StripBlock;
  on: boolean;
  stale: boolean;
  controls?: string;
  /** px; shares the strip equally without. */
  width?: number;
  onPress: () => void;
}

const LINES = 3;

const Line = ({ label, value, unit }: StripLine) => (
  <View style={{ flexDirection: 'row', justifyContent: 'space-between', gap: 6, height: 17 }}>
    <Text variant="secondary" tone="quiet" numberOfLines={1} style={{ flexShrink: 1 }}>{label}</Text>
    <Text variant="secondary" numberOfLines={1}>
      <Text variant="secondary" mono style={{ fontSize: 12.5, letterSpacing: -0.25 }}>{value}</Text>
      {unit ? <Text variant="secondary" tone="quiet">{unit === '°' ? unit : `\u00a0${unit}`}</Text> : null}
    </Text>
  </View>
);

const Mark = ({ mark, stale }: { mark: StripMark; stale: boolean }) => {
  const charge = mark.status === 'stored-charge';
  const tone = stale ? 'quiet' : mark.status === 'stored-charge' ? 'caution' : STATUS_COLOR[mark.status];
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: 4, height: 17 }}>
      {mark.status === 'stored-charge' ? <BoltIcon tone={tone} /> : <StatusMark status={mark.status} size={14} stale={stale} silent />}
      <Text variant="secondary" strong={!charge} tone={tone} numberOfLines={1} style={{ flexShrink: 1 }}>{mark.text}</Text>
    </View>
  );
};

/** What a screen reader says of a block. */
const spoken = ({ title, lines, mark }: StripBlock) =>
  [title, mark?.text, ...lines.map(({ label, value, unit }) => [label, value, unit].filter(Boolean).join(' '))].filter(Boolean).join(', ');

export const StripTab = ({ id, block, on, stale, controls, width, onPress }: StripTabProps) => {
  const { colors } = useTheme();
  const ground = on ? colors.paper : colors.panel;
  return (
    <Pressable
      id={id}
      role="tab"
      aria-selected={on}
      aria-label={spoken(block)}
      aria-controls={controls}
      tabIndex={on ? 0 : -1}
      onPress={onPress}
      style={{ width, flexGrow: width ? 0 : 1, flexBasis: width ?? 0, minWidth: 0, backgroundColor: ground, outlineOffset: -3 }}
    >
      <PathSymbol name={block.symbol} stroke={colors.ink} ground={ground} />
      <View style={{ paddingHorizontal: width ? 10 : 14 }}>
        <Text variant="legend" strong numberOfLines={1} style={{ letterSpacing: 0.62, textTransform: 'uppercase', lineHeight: 16 }}>{block.title}</Text>
        {block.lines.slice(0, block.mark ? LINES - 1 : LINES).map((line) => <Line key={line.label} {...line} />)}
        {block.mark ? <Mark mark={block.mark} stale={stale} /> : null}
      </View>
      {on ? <View style={{ position: 'absolute', top: 0, bottom: 0, left: 0, right: 0, borderTopWidth: 4, borderLeftWidth: 1, borderRightWidth: 1, borderColor: colors.ink, pointerEvents: 'none' }} /> : null}
    </Pressable>
  );
};
