import { useState } from 'react';
import { View } from 'react-native';

import { CheckRow } from '@/components/charts/CheckRow';
import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { useTheme } from '@/components/ui/theme';
import type { Check } from '@/shared/model/check';
import { formatQuantity } from '@/shared/quantity/format';

export interface CheckDialogProps {
  check: Check;
  readOnly: boolean;
  onClose: () => void;
  /** Null takes the setting aside back. */
  onSetAside: (reason: string | null) => void;
}

const SHORTEST_REASON = 3;

const Line = ({ label, text }: { label: string; text: string }) => {
  const { colors } = useTheme();
  return (
    <View style={{ flexDirection: 'row', gap: 12, paddingVertical: 6, borderBottomWidth: 1, borderBottomColor: colors.rule }}>
      <Text variant="label" tone="quiet" style={{ width: 110 }}>{label}</Text>
      <Text variant="label" style={{ flex: 1 }}>{text}</Text>
    </View>
  );
};

const amount = (value: number | null, { dimension, kind }: Check) => (value === null ? 'no figure' : [formatQuantity(value, dimension), kind].filter(Boolean).join(' '));

/** What a check stands on, and the way to set it aside with a reason. */
export const CheckDialog = ({ check, readOnly, onClose, onSetAside }: CheckDialogProps) => {
  const [reason, setReason] = useState(check.setAside ?? '');
  const long = reason.trim().length >= SHORTEST_REASON;
  const actions = (
    <>
      <Button label="Close" onPress={onClose} />
      {readOnly ? null : check.setAside === null ? <Button kind="primary" label="Set aside" disabled={!long} onPress={() => onSetAside(reason.trim())} /> : <Button kind="primary" label="Take back" onPress={() => onSetAside(null)} />}
    </>
  );
  return (
    <Dialog title={check.title} open onClose={onClose} actions={actions}>
      <CheckRow check={check} />
      <View>
        <Line label="Worst case" text={amount(check.value, check)} />
        <Line label="Nominal" text={amount(check.nominal, check)} />
        <Line label={check.sense === 'at-most' ? 'At most' : 'At least'} text={amount(check.rating, check)} />
        {check.offTime === null ? null : <Line label="Time off" text={formatQuantity(check.offTime, 'time')} />}
        {check.phase === null ? null : <Line label="Switched on at" text={formatQuantity(check.phase, 'angle')} />}
        <Line label="Basis" text={check.basis} />
        {check.remark ? <Line label="Remark" text={check.remark} /> : null}
      </View>
      {readOnly ? null : (
        <TextField label="Set aside because" hint="Say which document covers it. The check stays listed with this reason, and a reviewer sees it first." value={reason} onChangeText={setReason} multiline maxLength={500} readOnly={check.setAside !== null} />
      )}
    </Dialog>
  );
};
