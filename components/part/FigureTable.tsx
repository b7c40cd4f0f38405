import { View } from 'react-native';

import { LegendBracket } from '@/components/ui/LegendBracket';
import { StatusMark } from '@/components/ui/Marks';
import { Text } from '@/components/ui/Text';
import { useLayout, useTheme } from '@/components/ui/theme';
import type { PartRecord } from '@/shared/contracts/part';
import { quantityText } from '@/shared/quantity/format';

import { figuresOf, isGiven, type PartFigure } from './part-figures';

type Provenance = PartRecord['provenance'][number];

/** A figure's source may be filed for the figure itself or for something inside it. */
const sourceOf = (figure: PartFigure, provenance: readonly Provenance[]) =>
  provenance.find(({ figure: path }) => path === figure.path || path.startsWith(`${figure.path}.`));

const SourceText = ({ figure, source }: { figure: PartFigure; source: Provenance | undefined }) => {
  const given = isGiven(figure);
  const status = source ? 'pass' : given ? 'caution' : 'not-assessed';
  const text = source ? [source.document, source.page].filter(Boolean).join(', ') : given ? 'no source filed' : 'its check is not assessed';
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: 6 }}>
      <StatusMark status={status} silent size={14} />
      <Text variant="secondary" tone={source ? 'ink' : 'quiet'}>{text}</Text>
    </View>
  );
};

/** min / typical / max in one unit, chosen by the largest. */
const valueText = ({ min, typical, max, dimension, kind }: PartFigure) => {
  const given = [min, typical, max].filter((value) => value !== null);
  const last = given.at(-1);
  if (last === undefined) return { digits: 'not given', unit: '' };
  const digits = given.map((value) => quantityText(value, dimension));
  const { unit } = quantityText(last, dimension);
  const oneUnit = digits.every((text) => text.unit === unit);
  const text = digits.map(({ number, unit: own }) => (oneUnit ? number : `${number} ${own}`)).join(' / ');
  return { digits: text, unit: [oneUnit ? unit : '', kind ?? ''].filter(Boolean).join(' ') };
};

const FigureRow = ({ figure, source }: { figure: PartFigure; source: Provenance | undefined }) => {
  const { wide } = useLayout();
  const { colors } = useTheme();
  const { digits, unit } = valueText(figure);
  const condition = source?.condition || figure.condition;
  const bound = figure.min !== null && figure.max !== null ? 'min / typ / max' : figure.max !== null && figure.typical === null ? 'max' : '';
  return (
    <View role="row" style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: 10, rowGap: 2, paddingVertical: 7, borderBottomWidth: 1, borderBottomColor: colors.rule }}>
      <View role="cell" style={{ flexBasis: wide ? 170 : '55%', flexGrow: 1, flexShrink: 1 }}>
        <Text strong>{figure.label}</Text>
        <Text variant="secondary" tone="quiet">{[condition, bound].filter(Boolean).join(', ')}</Text>
      </View>
      <View role="cell" style={{ flexGrow: 1, alignItems: 'flex-end' }}>
        <Text mono={isGiven(figure)} tone={isGiven(figure) ? 'ink' : 'quiet'} variant="label">{digits}{unit ? <Text variant="label" tone="quiet"> {unit}</Text> : null}</Text>
      </View>
      <View role="cell" style={{ width: wide ? 190 : '100%', alignItems: wide ? 'flex-start' : 'flex-end' }}>
        <SourceText figure={figure} source={source} />
      </View>
    </View>
  );
};

/** Every figure that the checks need, with where it was read; what is missing is listed too. */
export const FigureTable = ({ record: { part, provenance } }: { record: PartRecord }) => {
  const figures = figuresOf(part);
  const given = figures.filter(isGiven).length;
  const { colors } = useTheme();
  return (
    <View style={{ gap: 4 }}>
      <LegendBracket title="Figures and their sources" remark={`${given} of ${figures.length} given`} />
      <View aria-hidden style={{ flexDirection: 'row', gap: 2, paddingVertical: 4 }}>
        {figures.map((figure) => (
          <View key={figure.path} style={{ flex: 1, height: 8, backgroundColor: isGiven(figure) ? (sourceOf(figure, provenance) ? colors.ink : colors.caution) : 'transparent', borderWidth: isGiven(figure) ? 0 : 1, borderStyle: 'dashed', borderColor: colors.notAssessed }} />
        ))}
      </View>
      <View role="table" aria-label={`Figures of ${part.name}`}>
        {figures.map((figure) => <FigureRow key={figure.path} figure={figure} source={sourceOf(figure, provenance)} />)}
      </View>
    </View>
  );
};
