import { useState } from 'react';
import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { useTheme } from '@/components/ui/theme';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useCreateToken, useRevokeToken, useTokens, type Token } from '@/hooks/session/useTokens';

const DAYS = 90;
const date = (iso: string) => new Date(iso).toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

const TokenRow = ({ token }: { token: Token }) => {
  const { colors } = useTheme();
  const revoke = useRevokeToken();
  const used = token.lastUsedAt ? `last used ${date(token.lastUsedAt)}` : 'never used';
  return (
    <View role="listitem" style={{ flexDirection: 'row', alignItems: 'center', gap: 8, paddingVertical: 6, borderBottomWidth: 1, borderBottomColor: colors.rule }}>
      <View style={{ flex: 1 }}>
        <Text strong>{token.name}</Text>
        <Text variant="secondary" tone="quiet">until {date(token.expiresAt)}, {used}</Text>
        {revoke.error ? <Text variant="secondary" tone="fail" role="alert">{errorSentence(revoke.error)}</Text> : null}
      </View>
      <Button label="Revoke" spoken={`Revoke ${token.name}`} busy={revoke.isPending} onPress={() => revoke.mutate(token.id)} />
    </View>
  );
};

const NewToken = () => {
  const [name, setName] = useState('');
  const create = useCreateToken();
  const make = () => {
    if (name.trim()) create.mutate({ name: name.trim(), days: DAYS }, { onSuccess: () => setName('') });
  };
  return (
    <View style={{ gap: 10 }}>
      <TextField label="Name of a new token" hint={`Such as the machine that uses it; it lasts ${DAYS} days`} value={name} onChangeText={setName} maxLength={80} onSubmitEditing={make} error={create.error ? errorSentence(create.error) : null} />
      <View style={{ alignSelf: 'flex-start' }}><Button label="Make a token" disabled={!name.trim()} busy={create.isPending} onPress={make} /></View>
      {create.data ? (
        <Notice kind="info" title="Copy it now, it is shown once">
          <Text mono selectable style={{ wordBreak: 'break-all' } as object}>{create.data.secret}</Text>
        </Notice>
      ) : null}
    </View>
  );
};

/** Keys with which programs reach the API in this person's name. */
export const TokenSection = () => {
  const { data, error, refetch } = useTokens();
  return (
    <View style={{ gap: 12 }}>
      <LegendBracket title="API tokens" remark="for programs, in your name" />
      {error ? <Notice kind="error" title="Not read" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice> : null}
      {data?.tokens.length === 0 ? <Text tone="quiet">No token yet.</Text> : null}
      <View role="list">{data?.tokens.map((token) => <TokenRow key={token.id} token={token} />)}</View>
      <NewToken />
    </View>
  );
};
