import { Link } from 'expo-router';
import { useState } from 'react';
import { Pressable, ScrollView, View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { DataTable, type Column } from '@/components/ui/DataTable';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/Page';
import { Quantity } from '@/components/ui/Quantity';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { useLayout } from '@/components/ui/theme';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useParts } from '@/hooks/part/useParts';
import type { PartSummary } from '@/shared/contracts/part';
import type { PartKind } from '@/shared/model/part';

import { KIND_SHORT } from './part-figures';

type KindFilter = PartKind | 'all';
const KINDS: readonly { value: KindFilter; label: string }[] = [
  { value: 'all', label: 'All' },
  { value: 'ntc', label: 'NTC' },
  { value: 'polymer-ptc', label: 'PPTC' },
  { value: 'resistor', label: 'Resistor' },
];

const NameCell = ({ id, part }: PartSummary) => (
  <Link href={`/parts/${id}`} asChild>
    <Pressable role="link" style={{ minHeight: 44, justifyContent: 'center' }}>
      <Text strong numberOfLines={1}>{part.name}</Text>
      <Text variant="secondary" tone="quiet" numberOfLines={1}>{part.maker}</Text>
    </Pressable>
  </Link>
);

const COLUMNS: readonly Column<PartSummary>[] = [
  { key: 'name', title: 'Part', width: 176, render: (row) => <NameCell {...row} /> },
  { key: 'kind', title: 'Kind', width: 84, render: ({ part }) => <Text variant="label">{KIND_SHORT[part.kind]}</Text> },
  { key: 'resistance', title: 'R25', width: 96, align: 'right', render: ({ resistance25 }) => <Quantity value={resistance25} dimension="resistance" variant="label" /> },
  { key: 'b', title: 'B (25/85)', width: 96, align: 'right', render: ({ part }) => (part.law.law === 'b-value' ? <Quantity value={part.law.b.nominal} dimension="temperatureInterval" variant="label" /> : <Text variant="label" tone="quiet">–</Text>) },
  { key: 'current', title: 'Steady current', width: 116, align: 'right', render: ({ part }) => <Quantity value={part.ratings.steadyCurrent?.current ?? null} dimension="current" kind="rms" variant="label" /> },
  { key: 'energy', title: 'Energy', width: 96, align: 'right', render: ({ part }) => <Quantity value={part.ratings.energy?.energy ?? null} dimension="energy" variant="label" /> },
  { key: 'temperature', title: 'Highest body', width: 110, align: 'right', render: ({ part }) => <Quantity value={part.ratings.maximumTemperature ?? null} dimension="temperature" variant="label" /> },
  { key: 'approval', title: 'Approval', width: 190, align: 'right', render: ({ approvedBy, revision }) => <Text variant="label" tone={approvedBy ? 'ink' : 'caution'} numberOfLines={1}>{approvedBy ? `rev ${revision}, ${approvedBy}` : `rev ${revision}, not approved`}</Text> },
];

/** The part library as a table: searched, by kind, each name an address of its own. */
export const PartListScreen = () => {
  const { wide } = useLayout();
  const [search, setSearch] = useState('');
  const [kind, setKind] = useState<KindFilter>('all');
  const { data: parts, error, refetch, hasNextPage, fetchNextPage, isFetchingNextPage } = useParts({ search, kind: kind === 'all' ? null : kind });
  return (
    <View style={{ flex: 1 }}>
      <PageHeader title="Parts" subtitle="Figures of the library, with their sources" />
      <ScrollView contentContainerStyle={{ padding: wide ? 20 : 16, gap: 14 }}>
        <View style={{ flexDirection: wide ? 'row' : 'column', gap: 12, alignItems: wide ? 'flex-end' : 'stretch' }}>
          <View style={{ width: wide ? 320 : undefined }}>
            <TextField label="Search parts" hideLabel placeholder="Name or maker" value={search} onChangeText={setSearch} maxLength={120} />
          </View>
          <Choice label="Kind of part" hideLabel options={KINDS} value={kind} onChange={setKind} />
        </View>
        {error ? <Notice kind="error" title="Parts not read" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice> : null}
        {!parts && !error ? <Text tone="quiet" role="status">Reading the library</Text> : null}
        {parts?.length === 0 ? <Text tone="quiet" role="status">No part fits. Clear the search or choose another kind.</Text> : null}
        {parts && parts.length > 0 ? <DataTable caption="Parts of the library" columns={COLUMNS} rows={parts} rowKey={(row) => row.id} /> : null}
        {hasNextPage ? <View style={{ alignSelf: 'flex-start' }}><Button label="More parts" busy={isFetchingNextPage} onPress={() => void fetchNextPage()} /></View> : null}
      </ScrollView>
    </View>
  );
};
