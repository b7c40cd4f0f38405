import { Link } from 'expo-router';
import { Pressable, View } from 'react-native';

import { PathGlyph } from '@/components/path-strip/PathGlyph';
import { STATUS_WORD, StatusMark } from '@/components/ui/Marks';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import { STATUS_COLOR } from '@/components/ui/tokens';
import type { ScenarioSummary } from '@/shared/contracts/scenario';

import { changeText } from './change-text';
import { ClosestCheck } from './ClosestCheck';

interface RowProps {
  summary: ScenarioSummary;
  now: Date;
}

const Mark = ({ verdict }: Pick<ScenarioSummary, 'verdict'>) => <StatusMark status={verdict?.status ?? 'not-assessed'} silent />;

/** One scenario in the phone's list; the whole row leads to it. */
export const NarrowRow = ({ summary, now }: RowProps) => {
  const { colors } = useTheme();
  const { id, name, verdict, path, version, updatedAt } = summary;
  return (
    <View role="listitem">
      <Link href={`/scenarios/${id}`} asChild>
        <Pressable role="link" aria-label={`${name}, ${verdict ? STATUS_WORD[verdict.status] : 'being computed'}`} style={{ paddingHorizontal: 16, paddingVertical: 12, gap: 6, borderBottomWidth: 1, borderBottomColor: colors.rule }}>
          <View style={{ flexDirection: 'row', alignItems: 'center', gap: 9 }}>
            <Mark verdict={verdict} />
            <Text strong numberOfLines={1} style={{ flex: 1 }}>{name}</Text>
          </View>
          <View style={{ flexDirection: 'row', alignItems: 'center', gap: 12 }}>
            <View style={{ flex: 1 }}><PathGlyph path={path} /></View>
            <View style={{ width: 160 }}><ClosestCheck {...summary} /></View>
          </View>
          <Text variant="secondary" tone="quiet">Draft {version} · {changeText(updatedAt, now)}</Text>
        </Pressable>
      </Link>
    </View>
  );
};

export interface WideRowProps extends RowProps {
  selected: boolean;
  onSelect: () => void;
}

const COLUMN = { path: 190, closest: 190, draft: 70, changed: 110 } as const;

export const WideHead = () => {
  const { colors } = useTheme();
  const head = (text: string, width?: number) => <Text variant="secondary" tone="quiet" style={width ? { width } : { flex: 1 }}>{text}</Text>;
  return (
    <View aria-hidden style={{ flexDirection: 'row', gap: 16, paddingHorizontal: 12, paddingVertical: 6, borderBottomWidth: 1, borderBottomColor: colors.ink }}>
      {head('Scenario')}
      {head('Path', COLUMN.path)}
      {head('Closest to failing', COLUMN.closest)}
      {head('State', COLUMN.draft)}
      {head('Changed', COLUMN.changed)}
    </View>
  );
};

/** One scenario in the wide list: its name leads to it, the rest of the row shows it at the side. */
export const WideRow = ({ summary, now, selected, onSelect }: WideRowProps) => {
  const { colors } = useTheme();
  const { id, name, verdict, path, version, updatedAt, updatedBy, keyFigures } = summary;
  const word = verdict ? STATUS_WORD[verdict.status] : 'Computing';
  return (
    <View role="listitem" aria-current={selected}>
      <Pressable focusable={false} tabIndex={-1} onPress={onSelect} style={{ flexDirection: 'row', alignItems: 'center', gap: 16, minHeight: 64, paddingHorizontal: 12, borderBottomWidth: 1, borderBottomColor: colors.rule, backgroundColor: selected ? colors.panel : 'transparent' }}>
        {selected ? <View style={{ position: 'absolute', left: 0, top: 0, bottom: 0, width: 4, backgroundColor: colors.ink }} /> : null}
        <View style={{ flex: 1, minWidth: 0, flexDirection: 'row', alignItems: 'center', gap: 10 }}>
          <Mark verdict={verdict} />
          <View style={{ flex: 1, minWidth: 0 }}>
            <Link href={`/scenarios/${id}`} asChild>
              <Pressable role="link" onFocus={onSelect} style={{ alignSelf: 'flex-start', maxWidth: '100%', paddingVertical: 2 }}><Text strong numberOfLines={1}>{name}</Text></Pressable>
            </Link>
            <Text variant="secondary" tone="quiet" numberOfLines={1}><Text variant="secondary" strong tone={verdict ? STATUS_COLOR[verdict.status] : 'quiet'}>{word}</Text> {keyFigures}</Text>
          </View>
        </View>
        <View style={{ width: COLUMN.path }}><PathGlyph path={path} /></View>
        <View style={{ width: COLUMN.closest }}><ClosestCheck {...summary} /></View>
        <Text variant="label" style={{ width: COLUMN.draft }}>Draft {version}</Text>
        <View style={{ width: COLUMN.changed }}>
          <Text variant="label">{changeText(updatedAt, now)}</Text>
          <Text variant="secondary" tone="quiet" numberOfLines={1}>{updatedBy}</Text>
        </View>
      </Pressable>
    </View>
  );
};
