import { View } from 'react-native';

import { CurvePlot } from '@/components/charts/CurvePlot';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Measured } from '@/components/ui/Measured';
import type { Part } from '@/shared/model/part';

const ZERO_CELSIUS = 273.15;
const COLDEST = 233.15;
const HEIGHT = 220;

interface Derating {
  ambient: number[];
  current: number[];
  /** Where the line comes from. */
  source: string;
}

/** The maker's points where there are some; else flat to the stated ambient, then straight to zero at the highest body temperature (common practice). */
const deratingOf = ({ ratings: { steadyCurrent, maximumTemperature } }: Part): Derating | null => {
  if (!steadyCurrent) return null;
  const { current, ambient, derating } = steadyCurrent;
  if (derating && derating.length > 1)
    return { ambient: derating.map((point) => point.ambient), current: derating.map((point) => point.share * current), source: "from the maker's points" };
  if (maximumTemperature === undefined) return null;
  return { ambient: [COLDEST, ambient, maximumTemperature], current: [current, current, 0], source: 'flat, then straight to zero: common practice' };
};

/** How much steady current is left as the ambient rises. */
export const DeratingPlot = ({ part }: { part: Part }) => {
  const derating = deratingOf(part);
  if (!derating) return null;
  const highest = Math.max(...derating.current);
  return (
    <View style={{ gap: 8 }}>
      <LegendBracket title="Steady current against ambient" remark={derating.source} />
      <Measured height={HEIGHT}>
        {(width) => (
          <CurvePlot
            title={`Steady current of ${part.name} against ambient`}
            x={{ label: 'ambient, °C', values: derating.ambient.map((kelvin) => kelvin - ZERO_CELSIUS) }}
            y={{ label: 'Steady current, A rms', scale: 'linear', domain: [0, highest * 1.2] }}
            line={derating.current}
            tone="current"
            width={width}
            height={HEIGHT}
          />
        )}
      </Measured>
    </View>
  );
};
