import { Redirect, useGlobalSearchParams, usePathname } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { View } from 'react-native';

import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/Page';
import { Text } from '@/components/ui/Text';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useSession } from '@/hooks/session/useSession';

import { signInHref } from './wanted-address';

/** Lets signed-in people through; others are asked to sign in and come back to the address that they wanted. */
export const Guard = ({ children }: { children: ReactNode }) => {
  const { data: session, error, refetch } = useSession();
  const pathname = usePathname();
  const { selected } = useGlobalSearchParams<{ selected?: string }>();
  // While nobody is let through no route is mounted, and the router forgets which one the address named.
  const here = signInHref(pathname, selected);
  const [door, setDoor] = useState(here);
  if (session && door !== here) setDoor(here);
  if (session) return children;
  if (session === null) return <Redirect href={door} />;
  return (
    <View style={{ flex: 1 }}>
      <PageHeader title="Tidegate" subtitle="Opening" />
      <View style={{ padding: 16 }}>
        {error ? (
          <Notice kind="error" title="Not opened" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice>
        ) : (
          <Text tone="quiet" role="status">Asking who is signed in</Text>
        )}
      </View>
    </View>
  );
};
