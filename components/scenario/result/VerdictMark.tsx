import { View } from 'react-native';
import Svg, { Circle, Path, Rect } from 'react-native-svg';

import { useTheme } from '@/components/ui/theme';
import { STATUS_COLOR } from '@/components/ui/tokens';
import type { Status } from '@/shared/model/check';

const WIDTH = 54;

/** The status as a filled tile; hollow while it is from before the last edit. */
export const VerdictMark = ({ status, stale }: { status: Status; stale: boolean }) => {
  const { colors } = useTheme();
  const color = colors[STATUS_COLOR[status]];
  const line = { stroke: stale ? colors.quiet : colors.onFilled, fill: 'none', strokeWidth: 2.6 } as const;
  return (
    <View aria-hidden style={{ width: WIDTH, alignItems: 'center', justifyContent: 'center', backgroundColor: stale ? 'transparent' : color, borderRightWidth: stale ? 1 : 0, borderRightColor: colors.rule2 }}>
      <Svg width={28} height={28} viewBox="0 0 28 28">
        {status === 'fail' && <Path {...line} strokeWidth={3.2} d="M6 6l16 16M22 6L6 22" />}
        {status === 'pass' && <><Circle {...line} cx={14} cy={14} r={12} /><Path {...line} d="M8 14.5l4.2 4.4L20 9.5" /></>}
        {status === 'caution' && <><Path {...line} strokeLinejoin="round" d="M14 2.5L26.5 25h-25z" /><Path {...line} d="M14 10.5v7.5M14 20.2v2.6" /></>}
        {status === 'not-assessed' && <><Rect {...line} x={3} y={3} width={22} height={22} rx={2} strokeDasharray="4.6 3" /><Path {...line} strokeWidth={1.8} d="M7 17L17 7M10 21L21 10" /></>}
      </Svg>
    </View>
  );
};
