import { useState } from 'react';
import { Pressable, View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Dialog } from '@/components/ui/Dialog';
import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { useTheme } from '@/components/ui/theme';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useParts } from '@/hooks/part/useParts';
import type { DraftNode } from '@/hooks/scenario/draft-tree';
import type { PartSummary } from '@/shared/contracts/part';
import type { Part, PartKind } from '@/shared/model/part';
import { formatQuantity } from '@/shared/quantity/format';

type KindFilter = PartKind | 'all';
const KINDS: readonly { value: KindFilter; label: string }[] = [
  { value: 'all', label: 'All' },
  { value: 'ntc', label: 'NTC' },
  { value: 'polymer-ptc', label: 'PPTC' },
  { value: 'resistor', label: 'Resistor' },
];

const lawText = ({ law }: Part): string => {
  if (law.law === 'b-value') return `R25 ${formatQuantity(law.r25.nominal, 'resistance', 3)}, B ${formatQuantity(law.b.nominal, 'temperatureInterval')}`;
  if (law.law === 'sigmoid') return `${formatQuantity(law.low.min, 'resistance', 3)} to ${formatQuantity(law.low.max, 'resistance', 3)}`;
  return law.law === 'fixed' ? formatQuantity(law.resistance.nominal, 'resistance', 3) : 'R(T) given as ' + (law.law === 'table' ? 'a table' : 'coefficients');
};

const ratingText = ({ ratings: { steadyCurrent, energy, maximumVoltage, maximumCurrent } }: Part): string =>
  [
    steadyCurrent && `${formatQuantity(steadyCurrent.current, 'current', 3)} rms`,
    energy && formatQuantity(energy.energy, 'energy', 3),
    maximumVoltage && `V_max ${formatQuantity(maximumVoltage, 'voltage', 3)}`,
    maximumCurrent && `I_max ${formatQuantity(maximumCurrent, 'current', 3)}`,
  ].filter(Boolean).join(', ');

const PartRow = ({ summary, current, onChoose }: { summary: PartSummary; current: boolean; onChoose: () => void }) => {
  const { colors } = useTheme();
  const { part } = summary;
  return (
    <View role="listitem">
      <Pressable role="button" aria-label={`Take ${part.name}: ${lawText(part)}${ratingText(part) ? `, ${ratingText(part)}` : ''}`} onPress={onChoose} style={{ minHeight: 52, paddingVertical: 6, borderBottomWidth: 1, borderBottomColor: colors.rule, flexDirection: 'row', alignItems: 'center', gap: 12 }}>
        <View style={{ flex: 1 }}>
          <Text strong numberOfLines={1}>{part.name}</Text>
          <Text variant="secondary" tone="quiet" numberOfLines={1}>{current ? 'in the path now' : [part.maker, summary.approvedBy ? '' : 'not approved'].filter(Boolean).join(', ')}</Text>
        </View>
        <View style={{ alignItems: 'flex-end' }}>
          <Text variant="label">{lawText(part)}</Text>
          <Text variant="secondary" tone="quiet">{ratingText(part) || 'no rating given'}</Text>
        </View>
      </Pressable>
    </View>
  );
};

export interface PartDialogProps {
  open: boolean;
  /** Library id of the part that is in the path now. */
  current: DraftNode;
  onClose: () => void;
  onChoose: (part: PartSummary) => void;
}

/** The library, searched, to take a part from. */
export const PartDialog = ({ open, current, onClose, onChoose }: PartDialogProps) => {
  const [search, setSearch] = useState('');
  const [kind, setKind] = useState<KindFilter>('all');
  const { data: parts, error, refetch, hasNextPage, fetchNextPage } = useParts({ search, kind: kind === 'all' ? null : kind }, open);
  return (
    <Dialog title="Choose a limiter" open={open} onClose={onClose} maxWidth={640} actions={<Button label="Cancel" onPress={onClose} />}>
      <TextField label="Search parts" hideLabel placeholder="Name or maker" value={search} onChangeText={setSearch} autoFocus maxLength={120} />
      <Choice label="Kind of part" hideLabel options={KINDS} value={kind} onChange={setKind} />
      {error ? <Notice kind="error" title="Parts not read" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice> : null}
      {parts?.length === 0 ? <Text tone="quiet" role="status">No part fits. Clear the search or choose another kind.</Text> : null}
      <View role="list" aria-label="Parts">
        {parts?.map((summary) => <PartRow key={summary.id} summary={summary} current={summary.id === current} onChoose={() => onChoose(summary)} />)}
      </View>
      {hasNextPage ? <Button label="More parts" onPress={() => void fetchNextPage()} /> : null}
    </Dialog>
  );
};
