import { View } from 'react-native';

import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/Page';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useScenario } from '@/hooks/scenario/useScenarios';
import { useSession } from '@/hooks/session/useSession';

import { EmptyPlot } from './result/EmptyPlot';
import { ScenarioBench } from './ScenarioBench';

const BACK = { href: '/scenarios', label: 'Back to the scenarios' } as const;

/** One scenario at its own address: opened, then worked on. */
export const ScenarioScreen = ({ id }: { id: string }) => {
  const { data: record, error, refetch } = useScenario(id);
  const { data: session } = useSession();
  if (record && session) return <ScenarioBench record={record} session={session} />;
  return (
    <View style={{ flex: 1 }}>
      <PageHeader title="Scenario" subtitle={error ? 'Not opened' : 'Opening'} back={BACK} />
      <View style={{ padding: 16 }}>
        {error ? <Notice kind="error" title="Scenario not opened" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice> : <EmptyPlot text="Opening the scenario" height={300} />}
      </View>
    </View>
  );
};
