import { Redirect, useLocalSearchParams } from 'expo-router';
import { useEffect, useRef, useState } from 'react';
import { ScrollView, View, type TextInput } from 'react-native';

import { Button } from '@/components/ui/Button';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { BrandMark } from '@/components/ui/NavIcons';
import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { useLayout, useTheme } from '@/components/ui/theme';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useSession, useSignIn } from '@/hooks/session/useSession';

import { GatePicture } from './GatePicture';
import { wantedHref } from './wanted-address';

const SignInForm = () => {
  const [email, setEmail] = useState('');
  const [password, setPassword] = useState('');
  const [asked, setAsked] = useState(false);
  const passwordField = useRef<TextInput>(null);
  const signIn = useSignIn();
  const emailError = asked && !/^\S+@\S+$/.test(email.trim()) ? 'Write the whole address, such as designer@ninebar.example' : null;
  const passwordError = asked && password === '' ? 'Write your password' : null;
  const submit = () => {
    setAsked(true);
    if (/^\S+@\S+$/.test(email.trim()) && password) signIn.mutate({ email: email.trim(), password }, { onError: () => passwordField.current?.focus() });
  };
  return (
    <View role="form" aria-label="Sign in" style={{ gap: 14 }}>
      <LegendBracket title="Sign in" remark="with your team's account" />
      {signIn.error ? <Notice kind="error" title="Not signed in">{errorSentence(signIn.error)}</Notice> : null}
      <TextField label="E-mail address" value={email} onChangeText={setEmail} autoComplete="username" inputMode="email" error={emailError} onSubmitEditing={() => passwordField.current?.focus()} />
      <TextField label="Password" value={password} onChangeText={setPassword} secureTextEntry autoComplete="current-password" inputRef={passwordField} error={passwordError} onSubmitEditing={submit} />
      <Button kind="primary" label={signIn.isPending ? 'Signing in' : 'Sign in'} busy={signIn.isPending} onPress={submit} />
    </View>
  );
};

/** The door: the name, what it is for, and the form. */
export const SignInScreen = () => {
  const { wide } = useLayout();
  const { colors } = useTheme();
  const { to } = useLocalSearchParams<{ to?: string }>();
  const { data: session } = useSession();
  useEffect(() => {
    if (typeof document !== 'undefined') document.title = 'Sign in · Tidegate';
  }, []);
  if (session) return <Redirect href={wantedHref(to)} />;
  return (
    <ScrollView role="main" style={{ flex: 1, backgroundColor: colors.paper }} contentContainerStyle={{ flexGrow: 1, flexDirection: wide ? 'row' : 'column' }}>
      <View style={{ flex: wide ? 1 : undefined, padding: wide ? 40 : 16, paddingTop: wide ? 40 : 28, gap: wide ? 20 : 14, backgroundColor: colors.panel, borderColor: colors.rule2, borderRightWidth: wide ? 1 : 0, borderBottomWidth: wide ? 0 : 1, justifyContent: 'space-between' }}>
        <View style={{ flexDirection: 'row', alignItems: 'center', gap: 12 }}>
          <BrandMark size={wide ? 40 : 32} />
          <Text variant="verdict" strong heading={1}>Tidegate</Text>
        </View>
        <GatePicture height={wide ? 340 : 130} />
        <Text tone="quiet" style={{ maxWidth: 520 }}>Sizes inrush current limiters and resettable fuses, and proves the choice by computation: over line, ambient, tolerance and switching angle, and when power comes back.</Text>
      </View>
      <View style={{ width: wide ? 440 : undefined, padding: wide ? 40 : 16, paddingTop: wide ? 40 : 24, gap: 24, justifyContent: wide ? 'center' : 'flex-start' }}>
        <SignInForm />
        {to ? <Text variant="secondary" tone="quiet">You will come to the page that you asked for.</Text> : null}
      </View>
    </ScrollView>
  );
};
