import { View } from 'react-native';

import { CurvePlot } from '@/components/charts/CurvePlot';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Measured } from '@/components/ui/Measured';
import { Text } from '@/components/ui/Text';
import { useLayout } from '@/components/ui/theme';
import type { PartRecord } from '@/shared/contracts/part';
import type { Part } from '@/shared/model/part';
import { formatQuantity } from '@/shared/quantity/format';

const ZERO_CELSIUS = 273.15;
const toCelsius = (kelvin: number) => kelvin - ZERO_CELSIUS;

const LAW_TEXT: Record<Part['law']['law'], string> = {
  'b-value': 'from the B-value',
  'steinhart-hart': 'from Steinhart–Hart coefficients',
  table: "points from the maker's table",
  sigmoid: 'from the law of the rise',
  fixed: 'constant',
};

const pointsOf = ({ law }: Part) => {
  if (law.law === 'table') return law.points.map(({ temperature, resistance }) => ({ x: toCelsius(temperature), y: resistance }));
  return law.law === 'b-value' ? [{ x: 25, y: law.r25.nominal }] : [];
};

const calloutOf = ({ law }: Part) => {
  if (law.law !== 'b-value') return undefined;
  const { nominal, max } = law.r25;
  const tolerance = max > nominal ? ` ±${((max / nominal - 1) * 100).toPrecision(2)} %` : '';
  return { x: 25, y: nominal, title: `R25 = ${formatQuantity(nominal, 'resistance')}${tolerance}`, text: `B = ${formatQuantity(law.b.nominal, 'temperatureInterval')}` };
};

/** R against body temperature on a logarithmic scale, with the band of the tolerances. */
export const ResistancePlot = ({ record: { part, curve } }: { record: PartRecord }) => {
  const { wide } = useLayout();
  const height = wide ? 500 : 320;
  const hottest = part.ratings.maximumTemperature;
  const callout = calloutOf(part);
  return (
    <View style={{ gap: 8 }}>
      <LegendBracket title={wide ? 'Resistance against temperature' : 'R against temperature'} remark={wide ? `log R; ${LAW_TEXT[part.law.law]}, band from tolerance` : LAW_TEXT[part.law.law]} />
      <Measured height={height}>
        {(width) => (
          <CurvePlot
            title={`Resistance of ${part.name} against body temperature`}
            x={{ label: 'body temperature, °C', values: curve.temperature.map(toCelsius) }}
            y={{ label: 'Resistance, Ω', scale: 'log' }}
            line={curve.nominal}
            band={{ low: curve.low, high: curve.high }}
            points={pointsOf(part)}
            tone="temperature"
            width={width}
            height={height}
            {...(callout ? { callout } : {})}
            {...(hottest === undefined ? {} : { ratingAt: { x: toCelsius(hottest), label: `maximum body ${formatQuantity(hottest, 'temperature', 3)}` } })}
          />
        )}
      </Measured>
      <Text variant="secondary" tone="quiet">The law is given from {formatQuantity(curve.valid.min, 'temperature', 3)} to {formatQuantity(curve.valid.max, 'temperature', 3)}; beyond that it is an extrapolation, and a result says so.</Text>
    </View>
  );
};
