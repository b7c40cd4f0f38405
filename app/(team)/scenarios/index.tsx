import { ScenarioListScreen } from '@/components/scenario/list/ScenarioListScreen';

export default function Scenarios() {
  return <ScenarioListScreen />;
}
