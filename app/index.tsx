import { FirstPlace } from '@/components/session/FirstPlace';

export default function Index() {
  return <FirstPlace />;
}
