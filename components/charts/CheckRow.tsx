import { Pressable, View } from 'react-native';

import { StatusMark, STATUS_WORD } from '@/components/ui/Marks';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import { STATUS_COLOR } from '@/components/ui/tokens';
import type { Check } from '@/shared/model/check';
import { quantityText } from '@/shared/quantity/format';

import { marginText, pairText } from './check-figures';
import { describeCorner } from './describe-corner';
import { MarginBar } from './MarginBar';

export interface CheckRowProps {
  check: Check;
  /** Rows of 49 px instead of 73, for a wide screen. */
  tight?: boolean;
  stale?: boolean;
  selected?: boolean;
  onPress?: () => void;
}

/** Widths that hold four digits before the point and two behind it, so that points stand under one another. */
const COLUMN = { whole: 32, fraction: 26, rating: 62 } as const;

const split = (digits: string): [string, string] => {
  const point = digits.indexOf('.');
  return point < 0 ? [digits, ''] : [digits.slice(0, point), digits.slice(point)];
};

interface RowText {
  value: string | null;
  rating: string;
  word: string;
  corner: string;
}
const textOf = (check: Check): RowText => {
  const { value, rating, dimension, sense } = check;
  const word = check.setAside === null ? [STATUS_WORD[check.status], marginText(check)].filter(Boolean).join(' ') : 'Set aside';
  const corner = describeCorner(check);
  if (value === null) return { value: null, rating: 'no figure', word, corner };
  if (rating === null) {
    const alone = quantityText(value, dimension);
    return { value: alone.number, rating: `${alone.unit}, no limit`, word, corner };
  }
  const pair = pairText(value, rating, dimension);
  return { value: pair.value, rating: `${sense === 'at-least' ? '≥' : 'of'} ${pair.rating}\u00a0${pair.unit}`, word, corner };
};

const Figures = ({ text, stale }: { text: RowText; stale: boolean }) => {
  const [whole, fraction] = split(text.value ?? '');
  const digits = { fontSize: 13, lineHeight: 18, letterSpacing: -0.26 } as const;
  const tone = stale ? 'quiet' : 'ink';
  return (
    <View style={{ flexDirection: 'row' }}>
      {text.value === null ? null : (
        <>
          <Text mono tone={tone} numberOfLines={1} style={{ ...digits, minWidth: COLUMN.whole, textAlign: 'right' }}>{whole}</Text>
          <Text mono tone={tone} numberOfLines={1} style={{ ...digits, minWidth: COLUMN.fraction }}>{fraction}</Text>
        </>
      )}
      <Text variant="label" tone="quiet" numberOfLines={1} style={{ minWidth: COLUMN.rating, textAlign: text.value === null ? 'right' : 'left' }}>{text.rating}</Text>
    </View>
  );
};

const spoken = (check: Check, text: RowText) =>
  [text.word, check.title, text.value === null ? text.rating : `${text.value} ${text.rating.replace('≥', 'at least')}`, text.corner].join(', ');

/** One check: mark, name and value of rating; its bar; the corner that governs it, and the margin in a word. */
export const CheckRow = ({ check, tight = false, stale = false, selected = false, onPress }: CheckRowProps) => {
  const { colors } = useTheme();
  const text = textOf(check);
  const grey = stale || check.setAside !== null;
  const ground = selected ? 'panel' : 'paper';
  const body = (
    <View style={{ paddingVertical: tight ? 2 : 7, borderBottomWidth: 1, borderBottomColor: colors.rule, backgroundColor: selected ? colors.panel : undefined }}>
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: 7 }}>
        <StatusMark status={check.status} stale={grey} silent />
        <Text strong tone={grey ? 'quiet' : 'ink'} numberOfLines={1} style={{ flex: 1, lineHeight: tight ? 17 : 18 }}>{check.title}</Text>
        <Figures text={text} stale={grey} />
      </View>
      <View style={{ marginTop: tight ? 0 : 5 }}><MarginBar check={check} variant={tight ? 'tight' : 'full'} stale={stale} ground={ground} silent /></View>
      <View style={{ flexDirection: 'row', gap: 7, marginTop: tight ? 0 : 3 }}>
        <Text variant="secondary" tone="quiet" numberOfLines={tight ? 1 : 2} style={{ flex: 1, lineHeight: tight ? 15 : 16 }}>{text.corner}</Text>
        <Text variant="secondary" strong tone={grey ? 'quiet' : STATUS_COLOR[check.status]} style={{ lineHeight: tight ? 15 : 16 }}>{text.word}</Text>
      </View>
      {selected ? <View style={{ position: 'absolute', left: -12, top: 0, bottom: 0, width: 4, backgroundColor: colors.ink }} /> : null}
    </View>
  );
  if (!onPress) return <View role="group" aria-label={spoken(check, text)}>{body}</View>;
  return <Pressable role="button" aria-label={spoken(check, text)} aria-pressed={selected} onPress={onPress}>{body}</Pressable>;
};
