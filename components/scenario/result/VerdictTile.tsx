import { View } from 'react-native';

import { StatusMark } from '@/components/ui/Marks';
import { Plate } from '@/components/ui/Plate';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import { STATUS_COLOR } from '@/components/ui/tokens';
import type { Status } from '@/shared/model/check';
import type { Assessment } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';

import { spokenSentence, VERDICT_WORD, verdictSentence } from './verdict-sentence';
import { VerdictMark } from './VerdictMark';

export interface VerdictTileProps {
  assessment: Pick<Assessment, 'verdict' | 'checks'>;
  scenario: Scenario;
  stale?: boolean;
  /** One line of 52 px, while a block is being edited on a phone. */
  collapsed?: boolean;
}

const COUNTED: readonly { status: Status; word: string }[] = [
  { status: 'fail', word: 'fail' },
  { status: 'caution', word: 'caution' },
  { status: 'not-assessed', word: 'not assessed' },
  { status: 'pass', word: 'pass' },
];

const Counts = ({ counts, stale }: { counts: Assessment['verdict']['counts']; stale: boolean }) => (
  <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: 12, rowGap: 2 }}>
    {COUNTED.filter(({ status }) => counts[status] > 0).map(({ status, word }) => (
      <View key={status} style={{ flexDirection: 'row', alignItems: 'center', gap: 5 }}>
        <StatusMark status={status} stale={stale} silent size={14} />
        <Text variant="secondary" tone="quiet"><Text variant="secondary" strong tone={stale ? 'quiet' : STATUS_COLOR[status]}>{counts[status]}</Text> {word}</Text>
      </View>
    ))}
    {counts['set-aside'] > 0 ? <Text variant="secondary" tone="quiet">{counts['set-aside']} set aside</Text> : null}
  </View>
);

/** The verdict at one look: a filled tile with its mark, the word, one sentence, the counts. A screen reader hears each new one. */
export const VerdictTile = ({ assessment, scenario, stale = false, collapsed = false }: VerdictTileProps) => {
  const { colors } = useTheme();
  const { verdict, checks } = assessment;
  const sentence = verdictSentence(verdict, checks, scenario);
  const word = VERDICT_WORD[verdict.status];
  const tone = stale ? 'quiet' : STATUS_COLOR[verdict.status];
  return (
    <View style={{ flexDirection: 'row', minHeight: collapsed ? 52 : 104, borderBottomWidth: 1, borderBottomColor: colors.rule2, backgroundColor: colors.panel }}>
      <VerdictMark status={verdict.status} stale={stale} />
      <View style={{ flex: 1, paddingHorizontal: 14, paddingVertical: collapsed ? 6 : 10, gap: 4, justifyContent: 'center' }}>
        <View aria-hidden style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: 10 }}>
          <Text variant={collapsed ? 'body' : 'verdict'} tone={tone} strong={collapsed}>{word}</Text>
          {stale ? <Plate text="Before your last edit" /> : null}
        </View>
        <Text aria-hidden variant={collapsed ? 'secondary' : 'body'} tone={stale ? 'quiet' : 'ink'} numberOfLines={collapsed ? 1 : undefined}>
          {sentence.map(({ text, strong }, index) => <Text key={index} variant={collapsed ? 'secondary' : 'body'} tone={stale ? 'quiet' : 'ink'} strong={strong ?? false}>{text}</Text>)}
        </Text>
        {collapsed ? null : <Counts counts={verdict.counts} stale={stale} />}
      </View>
      <Text role="status" aria-live="polite" style={{ position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 }}>{stale ? '' : `${word}. ${spokenSentence(sentence)}`}</Text>
    </View>
  );
};
