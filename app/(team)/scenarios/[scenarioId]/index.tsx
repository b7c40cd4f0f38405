import { useLocalSearchParams } from 'expo-router';

import { ScenarioScreen } from '@/components/scenario/ScenarioScreen';

export default function Scenario() {
  const { scenarioId } = useLocalSearchParams<{ scenarioId: string }>();
  return <ScenarioScreen key={scenarioId} id={scenarioId} />;
}
