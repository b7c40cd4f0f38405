import { Link } from 'expo-router';
import { Pressable, ScrollView, View } from 'react-native';

import { Caution } from '@/components/ui/Caution';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { STATUS_WORD, StatusMark } from '@/components/ui/Marks';
import { Notice } from '@/components/ui/Notice';
import { PageHeader } from '@/components/ui/Page';
import { Plate } from '@/components/ui/Plate';
import { Text } from '@/components/ui/Text';
import { useLayout, useTheme } from '@/components/ui/theme';
import { errorSentence } from '@/hooks/api/error-sentence';
import { usePart } from '@/hooks/part/useParts';
import type { PartRecord } from '@/shared/contracts/part';
import type { Status } from '@/shared/model/check';
import { formatQuantity } from '@/shared/quantity/format';

import { DeratingPlot } from './DeratingPlot';
import { FigureTable } from './FigureTable';
import { KIND_TEXT } from './part-figures';
import { ResistancePlot } from './ResistancePlot';

/** Above this a touch burns: common practice takes 60 °C for short touch of metal. */
const HOT_FROM = 333.15;

const isStatus = (text: string | null): text is Status => text !== null && text in STATUS_WORD;

const UsedIn = ({ usedIn }: { usedIn: PartRecord['usedIn'] }) => {
  const { colors } = useTheme();
  return (
    <View style={{ gap: 4 }}>
      <LegendBracket title="Used in" remark={usedIn.length === 0 ? 'no scenario yet' : `${usedIn.length} ${usedIn.length === 1 ? 'scenario' : 'scenarios'}`} />
      <View role="list">
        {usedIn.map(({ id, name, status }) => (
          <View role="listitem" key={id} style={{ borderBottomWidth: 1, borderBottomColor: colors.rule }}>
            <Link href={`/scenarios/${id}`} asChild>
              <Pressable role="link" style={{ flexDirection: 'row', alignItems: 'center', gap: 10, minHeight: 44 }}>
                <StatusMark status={isStatus(status) ? status : 'not-assessed'} />
                <Text style={{ flex: 1 }} numberOfLines={1}>{name}</Text>
              </Pressable>
            </Link>
          </View>
        ))}
      </View>
    </View>
  );
};

const HotSurface = ({ part }: PartRecord) => {
  const hottest = part.ratings.maximumTemperature;
  if (hottest === undefined || hottest < HOT_FROM) return null;
  return (
    <Caution title="Hot surface">
      The body may reach {formatQuantity(hottest, 'temperature', 3)} in use. Keep neighbours and fingers away; see the temperature checks of each scenario. Local codes and licensed practice come first.
    </Caution>
  );
};

const Approval = ({ approvedBy, revision }: PartRecord) => (
  <Plate icon={<StatusMark status={approvedBy ? 'pass' : 'caution'} silent size={14} />} text={approvedBy ? `Approved, revision ${revision}` : `Revision ${revision}, not approved`} />
);

const PartBody = ({ record }: { record: PartRecord }) => {
  const { wide } = useLayout();
  const { colors } = useTheme();
  const column = wide ? ({ flex: 1, padding: 20, gap: 24 } as const) : ({ padding: 16, gap: 24 } as const);
  const left = (
    <>
      <ResistancePlot record={record} />
      <UsedIn usedIn={record.usedIn} />
    </>
  );
  const right = (
    <>
      <FigureTable record={record} />
      <DeratingPlot part={record.part} />
      <HotSurface {...record} />
    </>
  );
  if (!wide) return <ScrollView tabIndex={0} contentContainerStyle={column}><Approval {...record} />{left}{right}</ScrollView>;
  return (
    <View style={{ flex: 1, flexDirection: 'row' }}>
      <ScrollView tabIndex={0} style={{ flex: 1.1, borderRightWidth: 1, borderRightColor: colors.rule2 }} contentContainerStyle={column}>{left}</ScrollView>
      <ScrollView tabIndex={0} style={{ flex: 1 }} contentContainerStyle={column}>{right}</ScrollView>
    </View>
  );
};

/** One part: its law as a plot, every figure with its source, where it is used. */
export const PartScreen = ({ id }: { id: string }) => {
  const { wide } = useLayout();
  const { data: record, error, refetch } = usePart(id);
  return (
    <View style={{ flex: 1 }}>
      <PageHeader
        title={record?.part.name ?? 'Part'}
        subtitle={record ? [record.part.maker, KIND_TEXT[record.part.kind]].filter(Boolean).join(' · ') : 'Opening'}
        back={{ href: '/parts', label: 'Back to the parts' }}
        actions={record && wide ? <Approval {...record} /> : null}
      />
      {error ? <View style={{ padding: 16 }}><Notice kind="error" title="Part not read" action={{ label: 'Try again', onPress: () => void refetch() }}>{errorSentence(error)}</Notice></View> : null}
      {record ? <PartBody record={record} /> : null}
    </View>
  );
};
