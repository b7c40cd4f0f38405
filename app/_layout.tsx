import { QueryClientProvider } from '@tanstack/react-query';
import { FontDisplay, useFonts } from 'expo-font';
import { Stack, type ErrorBoundaryProps } from 'expo-router';
import Head from 'expo-router/head';
import { useState } from 'react';
import { View } from 'react-native';

import sofia from '@/assets/fonts/sofia-sans-400.woff2';
import sofiaStrong from '@/assets/fonts/sofia-sans-600.woff2';
import sometype from '@/assets/fonts/sometype-mono-400.woff2';
import sometypeStrong from '@/assets/fonts/sometype-mono-600.woff2';
import { Notice } from '@/components/ui/Notice';
import { ThemeProvider, useTheme } from '@/components/ui/theme';
import { FACES } from '@/components/ui/tokens';
import { makeQueryClient } from '@/hooks/api/query-client';

/** Text is drawn at once in what the system has, and changes face when ours is there. */
const shownAtOnce = (uri: number) => ({ uri, display: FontDisplay.SWAP });
const FONTS = {
  [FACES.text]: shownAtOnce(sofia),
  [FACES.textStrong]: shownAtOnce(sofiaStrong),
  [FACES.mono]: shownAtOnce(sometype),
  [FACES.monoStrong]: shownAtOnce(sometypeStrong),
};

const Pages = () => {
  const { colors } = useTheme();
  return <Stack screenOptions={{ headerShown: false, animation: 'none', contentStyle: { backgroundColor: colors.paper } }} />;
};

export default function RootLayout() {
  useFonts(FONTS);
  const [queryClient] = useState(makeQueryClient);
  return (
    <ThemeProvider>
      <Head><title>Tidegate</title></Head>
      <QueryClientProvider client={queryClient}>
        <Pages />
      </QueryClientProvider>
    </ThemeProvider>
  );
}

export function ErrorBoundary({ error, retry }: ErrorBoundaryProps) {
  return (
    <ThemeProvider>
      <View style={{ padding: 16 }}>
        <Notice kind="error" title="This page could not be drawn" action={{ label: 'Try again', onPress: () => void retry() }}>
          {error.message} What you saved is kept.
        </Notice>
      </View>
    </ThemeProvider>
  );
}
