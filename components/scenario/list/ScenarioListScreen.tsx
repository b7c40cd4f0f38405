import { useLocalSearchParams, useRouter } from 'expo-router';
import { useState } from 'react';
import { ScrollView, View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/Page';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { useLayout, useTheme } from '@/components/ui/theme';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useScenarios } from '@/hooks/scenario/useScenarios';
import { useMayDesign, useSession } from '@/hooks/session/useSession';
import type { ScenarioSummary } from '@/shared/contracts/scenario';

import { DeleteDialog } from './DeleteDialog';
import { EmptyList } from './EmptyList';
import { NewScenarioDialog } from './NewScenarioDialog';
import { NarrowRow, WideHead, WideRow } from './ScenarioRow';
import { ScenarioDetail } from './ScenarioDetail';
import { useMakeScenario } from './useMakeScenario';

const DETAIL_WIDTH = 380;
/** Below this width the list has no room for a detail beside it. */
const DETAIL_FROM = 1240;

interface ListProps {
  scenarios: readonly ScenarioSummary[];
  selected: ScenarioSummary | undefined;
  onSelect: (id: string) => void;
}

const Rows = ({ scenarios, selected, onSelect }: ListProps) => {
  const { wide } = useLayout();
  const [now] = useState(() => new Date());
  if (!wide) return <View role="list" aria-label="Scenarios">{scenarios.map((one) => <NarrowRow key={one.id} summary={one} now={now} />)}</View>;
  return (
    <View>
      <WideHead />
      <View role="list" aria-label="Scenarios">
        {scenarios.map((one) => <WideRow key={one.id} summary={one} now={now} selected={one.id === selected?.id} onSelect={() => onSelect(one.id)} />)}
      </View>
    </View>
  );
};

/** The team's scenarios, last changed first, with the closest check of each; wide, the selected one beside them. */
export const ScenarioListScreen = () => {
  const { wide, width } = useLayout();
  const { colors } = useTheme();
  const router = useRouter();
  const { selected: wanted } = useLocalSearchParams<{ selected?: string }>();
  const [search, setSearch] = useState('');
  const [making, setMaking] = useState(false);
  const [deleting, setDeleting] = useState<ScenarioSummary | null>(null);
  const { data: session } = useSession();
  const mayDesign = useMayDesign();
  const { data: scenarios, error, refetch, hasNextPage, fetchNextPage, isFetchingNextPage } = useScenarios(search);
  const { clone, cloneError } = useMakeScenario();
  const selected = scenarios?.find(({ id }) => id === wanted) ?? scenarios?.[0];
  const detail = wide && width >= DETAIL_FROM;
  const searchField = <TextField label="Search scenarios" hideLabel placeholder="Search by name" value={search} onChangeText={setSearch} maxLength={120} />;
  const list = (
    <>
      {error ? <View style={{ padding: 16 }}><Notice kind="error" title="Scenarios not read" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice></View> : null}
      {cloneError ? <View style={{ padding: 16 }}><Notice kind="error" title="Not cloned">{errorSentence(cloneError)}</Notice></View> : null}
      {!scenarios && !error ? <Text tone="quiet" role="status" style={{ padding: 16 }}>Reading the scenarios</Text> : null}
      {scenarios?.length === 0 ? <EmptyList search={search} mayDesign={mayDesign} onNew={() => setMaking(true)} /> : null}
      {scenarios && scenarios.length > 0 ? <Rows scenarios={scenarios} selected={detail ? selected : undefined} onSelect={(id) => router.setParams({ selected: id })} /> : null}
      {hasNextPage ? <View style={{ padding: 16, alignSelf: 'flex-start' }}><Button label="More scenarios" busy={isFetchingNextPage} onPress={() => void fetchNextPage()} /></View> : null}
    </>
  );
  return (
    <View style={{ flex: 1 }}>
      <PageHeader
        title="Scenarios"
        subtitle={session?.team.name ?? ''}
        actions={
          <>
            {wide ? <View style={{ width: 280 }}>{searchField}</View> : null}
            {mayDesign ? <Button kind="primary" label={wide ? 'New scenario' : 'New'} spoken="New scenario" onPress={() => setMaking(true)} /> : null}
          </>
        }
      />
      {wide ? null : <View style={{ padding: 16, borderBottomWidth: 1, borderBottomColor: colors.rule }}>{searchField}</View>}
      <View style={{ flex: 1, flexDirection: 'row', minHeight: 0 }}>
        <ScrollView style={{ flex: 1 }} contentContainerStyle={wide ? { padding: 20, gap: 6 } : {}}>
          {wide ? <LegendBracket title="All scenarios" remark="last changed first" /> : null}
          {list}
        </ScrollView>
        {detail && selected ? <View style={{ width: DETAIL_WIDTH, borderLeftWidth: 1, borderLeftColor: colors.rule2 }}><ScenarioDetail key={selected.id} summary={selected} mayDesign={mayDesign} onClone={clone} onDelete={() => setDeleting(selected)} /></View> : null}
      </View>
      {making ? <NewScenarioDialog scenarios={scenarios ?? []} onClose={() => setMaking(false)} /> : null}
      {deleting ? <DeleteDialog summary={deleting} onClose={() => setDeleting(null)} /> : null}
    </View>
  );
};
