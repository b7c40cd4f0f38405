import { ScrollView, View } from 'react-native';

import { CheckList } from '@/components/charts/CheckList';
import { PathGlyph } from '@/components/path-strip/PathGlyph';
import { Button, ButtonLink } from '@/components/ui/Button';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useScenario } from '@/hooks/scenario/useScenarios';
import { useSimulation } from '@/hooks/scenario/useSimulation';
import type { ScenarioRecord, ScenarioSummary } from '@/shared/contracts/scenario';

import { VerdictTile } from '../result/VerdictTile';

interface DetailProps {
  summary: ScenarioSummary;
  mayDesign: boolean;
  onClone: (record: ScenarioRecord) => void;
  onDelete: () => void;
}

const Result = ({ record }: { record: ScenarioRecord }) => {
  const { assessment, stale, error, retry } = useSimulation(record.scenario);
  if (!assessment && error) return <View style={{ padding: 12 }}><Notice kind="error" title="Not computed" action={{ label: 'Try again', onPress: retry }}>{errorSentence(error)}</Notice></View>;
  if (!assessment) return <Text tone="quiet" role="status" style={{ padding: 16 }}>Computing</Text>;
  return (
    <>
      <VerdictTile assessment={assessment} scenario={record.scenario} stale={stale} />
      <View style={{ padding: 16, gap: 8 }}>
        <LegendBracket title={record.name} />
        <PathGlyph path={record.path} />
        <CheckList checks={assessment.checks} stale={stale} />
      </View>
    </>
  );
};

/** The selected scenario beside the list: its verdict and checks, and what can be done with it. */
export const ScenarioDetail = ({ summary, mayDesign, onClone, onDelete }: DetailProps) => {
  const { data: record, error, refetch } = useScenario(summary.id);
  return (
    <ScrollView contentContainerStyle={{ paddingBottom: 24 }}>
      {error ? <View style={{ padding: 12 }}><Notice kind="error" title="Not opened" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice></View> : null}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: 8, paddingHorizontal: 16, paddingVertical: 10 }}>
        <ButtonLink kind="primary" label="Open" spoken={`Open ${summary.name}`} href={`/scenarios/${summary.id}`} />
        {mayDesign && record ? <Button label="Clone" spoken={`Clone ${summary.name}`} onPress={() => onClone(record)} /> : null}
        {mayDesign ? <Button label="Delete" spoken={`Delete ${summary.name}`} onPress={onDelete} /> : null}
      </View>
      {record ? <Result key={record.id} record={record} /> : null}
    </ScrollView>
  );
};
