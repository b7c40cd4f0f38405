import { AccountScreen } from '@/components/session/AccountScreen';

export default function Account() {
  return <AccountScreen />;
}
