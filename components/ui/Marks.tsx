import Svg, { Circle, Path, Rect } from 'react-native-svg';

import type { Status } from '@/shared/model/check';

import { useTheme } from './theme';
import { STATUS_COLOR } from './tokens';

export const STATUS_WORD: Record<Status, string> = { fail: 'Fail', 'not-assessed': 'Not assessed', caution: 'Caution', pass: 'Pass' };

export interface StatusMarkProps {
  status: Status;
  size?: number;
  /** From before the last edit: hollow and grey. */
  stale?: boolean;
  /** The word stands beside it, so that it need not be spoken twice. */
  silent?: boolean;
}

/** The status as a shape of its own, so that colour never speaks alone. */
export const StatusMark = ({ status, size = 16, stale = false, silent = false }: StatusMarkProps) => {
  const { colors } = useTheme();
  const color = stale ? colors.quiet : colors[STATUS_COLOR[status]];
  const spoken = silent ? { 'aria-hidden': true } : { role: 'img' as const, 'aria-label': STATUS_WORD[status] };
  return (
    <Svg width={size} height={size} viewBox="0 0 16 16" fill="none" {...spoken}>
      {status === 'pass' && <><Circle cx={8} cy={8} r={6.75} stroke={color} strokeWidth={1.5} /><Path d="M4.8 8.2l2.3 2.4 4.2-5" stroke={color} strokeWidth={1.6} /></>}
      {status === 'caution' && <><Path d="M8 1.4L15 14H1z" stroke={color} strokeWidth={1.5} strokeLinejoin="round" /><Path d="M8 5.8v4M8 11v1.6" stroke={color} strokeWidth={1.7} /></>}
      {status === 'fail' && <><Rect x={1} y={1} width={14} height={14} rx={1.5} fill={stale ? 'none' : color} stroke={color} strokeWidth={stale ? 1.4 : 0} /><Path d="M4.6 4.6l6.8 6.8M11.4 4.6l-6.8 6.8" stroke={stale ? color : colors.onFilled} strokeWidth={1.9} /></>}
      {status === 'not-assessed' && <><Rect x={1.75} y={1.75} width={12.5} height={12.5} rx={1.5} stroke={color} strokeWidth={1.3} strokeDasharray="2.6 1.7" /><Path d="M4 9.5L9.5 4M6 12l6-6" stroke={color} strokeWidth={1.1} /></>}
    </Svg>
  );
};
