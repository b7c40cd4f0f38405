import { View } from 'react-native';

import { LegendBracket } from '@/components/ui/LegendBracket';
import { Quantity } from '@/components/ui/Quantity';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import { FIGURES, type FigureId } from '@/shared/model/figure-list';
import type { Assessment } from '@/shared/model/result';
import type { Dimension } from '@/shared/quantity/dimension';

const ORDER = Object.keys(FIGURES) as FigureId[];

const FigureLine = ({ label, value, dimension }: { label: string; value: number; dimension: Dimension }) => {
  const { colors } = useTheme();
  return (
    <View role="listitem" style={{ flexDirection: 'row', justifyContent: 'space-between', gap: 12, paddingVertical: 5, borderBottomWidth: 1, borderBottomColor: colors.rule, flexBasis: 300, flexGrow: 1 }}>
      <Text variant="label" style={{ flexShrink: 1 }}>{label}</Text>
      <Quantity value={value} dimension={dimension} variant="label" />
    </View>
  );
};

/** Figures of the nominal run, and what entered it as an assumption. */
export const FiguresView = ({ assessment: { run, engineVersion } }: { assessment: Assessment }) => {
  const notes = [...run.remarks, ...run.audit.notes];
  return (
    <View style={{ gap: 16 }}>
      <View role="list" aria-label="Figures of the nominal run" style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: 24 }}>
        {ORDER.map((id) => {
          const value = run.figures[id];
          return value === null ? null : <FigureLine key={id} label={FIGURES[id].label} value={value} dimension={FIGURES[id].dimension} />;
        })}
        {run.elements.map((element, index) => (
          <FigureLine key={`${element.name}-${index}`} label={`${element.name}, highest body temperature`} value={element.peakTemperature} dimension="temperature" />
        ))}
      </View>
      {notes.length > 0 ? (
        <View style={{ gap: 6 }}>
          <LegendBracket title="What entered" remark={`engine ${engineVersion}`} level={3} />
          {notes.map((note) => <Text key={note} variant="label" tone="quiet">{note}</Text>)}
        </View>
      ) : null}
    </View>
  );
};
