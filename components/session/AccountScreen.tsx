import { useState } from 'react';
import { ScrollView, View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { PageHeader } from '@/components/ui/Page';
import { Text } from '@/components/ui/Text';
import { useLayout, useTheme, type ThemeChoice } from '@/components/ui/theme';
import { useSession, useSignOut } from '@/hooks/session/useSession';
import type { Role, Session } from '@/shared/contracts/session';

import { TokenSection } from './TokenSection';

const ROLE_TEXT: Record<Role, string> = {
  designer: 'designer: owns scenarios, edits and runs them',
  librarian: 'librarian: looks after the part data',
  'test-engineer': 'test engineer: looks after bench captures',
  reviewer: 'reviewer: reads, and judges what was computed',
  admin: 'admin: looks after people and roles',
};

const THEMES: readonly { value: ThemeChoice; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

const WhoAmI = ({ session }: { session: Session }) => (
  <View style={{ gap: 8 }}>
    <LegendBracket title="Signed in" />
    <Text strong>{session.user.name}</Text>
    <Text tone="quiet">{session.user.email}</Text>
    {session.user.roles.map((role) => <Text key={role} variant="label">{ROLE_TEXT[role]}</Text>)}
  </View>
);

const Appearance = () => {
  const { choice, setChoice } = useTheme();
  return (
    <View style={{ gap: 10 }}>
      <LegendBracket title="Appearance" remark="in this browser" />
      <Choice label="Light or dark" hideLabel options={THEMES} value={choice} onChange={setChoice} />
    </View>
  );
};

const Leave = () => {
  const signOut = useSignOut();
  const [asked, setAsked] = useState(false);
  return (
    <View style={{ gap: 10, alignItems: 'flex-start' }}>
      <View style={{ alignSelf: 'stretch' }}><LegendBracket title="Leave" /></View>
      <Button label="Sign out" busy={signOut.isPending} onPress={() => { setAsked(true); signOut.mutate(); }} />
      {asked && signOut.error ? <Text tone="fail" role="alert">Not signed out: no answer from the server. Try again when connected.</Text> : null}
    </View>
  );
};

/** Who one is here, how the pages look, keys for programs, and the way out. */
export const AccountScreen = () => {
  const { data: session } = useSession();
  const { wide } = useLayout();
  if (!session) return null;
  const column = { flex: wide ? 1 : undefined, gap: 28, maxWidth: wide ? 560 : undefined } as const;
  return (
    <View style={{ flex: 1 }}>
      <PageHeader title="Account" subtitle={session.team.name} />
      <ScrollView contentContainerStyle={{ padding: wide ? 20 : 16, flexDirection: wide ? 'row' : 'column', gap: wide ? 40 : 28 }}>
        <View style={column}>
          <WhoAmI session={session} />
          <Appearance />
          <Leave />
        </View>
        <View style={column}>
          <TokenSection />
        </View>
      </ScrollView>
    </View>
  );
};
