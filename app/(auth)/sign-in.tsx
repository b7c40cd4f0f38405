import { SignInScreen } from '@/components/session/SignInScreen';

export default function SignIn() {
  return <SignInScreen />;
}
