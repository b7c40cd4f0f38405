import { PartListScreen } from '@/components/part/PartListScreen';

export default function Parts() {
  return <PartListScreen />;
}
