import { useLocalSearchParams } from 'expo-router';

import { PartScreen } from '@/components/part/PartScreen';

export default function Part() {
  const { partId } = useLocalSearchParams<{ partId: string }>();
  return <PartScreen key={partId} id={partId} />;
}
