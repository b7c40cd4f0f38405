import { Redirect } from 'expo-router';
import { useEffect, useState } from 'react';
import { View } from 'react-native';

import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useScenarios } from '@/hooks/scenario/useScenarios';
import { useSession } from '@/hooks/session/useSession';
import { markWelcomed, wasWelcomed } from '@/hooks/session/welcome';
import type { ScenarioSummary } from '@/shared/contracts/scenario';

/** The finding worth seeing first: a design that passes cold and fails when power comes back. */
const workedDemo = (scenarios: readonly ScenarioSummary[]) =>
  scenarios.find(({ verdict, closest }) => verdict?.status === 'fail' && closest?.id === 'restart-peak-current');

const FirstScenario = ({ userId }: { userId: string }) => {
  const { data: scenarios, error, refetch } = useScenarios('');
  const [first] = useState(() => !wasWelcomed(userId));
  const demo = workedDemo(scenarios ?? []);
  // On a fresh start the verdicts are still being computed; the list asks again until they are there.
  const known = demo !== undefined || (scenarios?.every(({ verdict }) => verdict !== null) ?? false);
  useEffect(() => {
    if (known) markWelcomed(userId);
  }, [known, userId]);
  if (!first) return <Redirect href="/scenarios" />;
  if (error) return <Notice kind="error" title="Not opened" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice>;
  if (!known) return <Text tone="quiet" role="status">Opening: the first verdicts are being computed</Text>;
  return <Redirect href={demo ? `/scenarios/${demo.id}` : '/scenarios'} />;
};

/** Where the bare address leads: a first visit to the worked demo, later ones to the list, a stranger to sign-in. */
export const FirstPlace = () => {
  const { data: session, error, refetch } = useSession();
  if (session === null) return <Redirect href="/sign-in" />;
  return (
    <View role="main" style={{ flex: 1, padding: 16 }}>
      {error ? <Notice kind="error" title="Not opened" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice> : null}
      {session ? <FirstScenario userId={session.user.id} /> : <Text tone="quiet" role="status">Opening Tidegate</Text>}
    </View>
  );
};
