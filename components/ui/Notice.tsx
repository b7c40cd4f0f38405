import type { ReactNode } from 'react';
import { View } from 'react-native';

import { Button } from './Button';
import { StatusMark } from './Marks';
import { OpenContactIcon } from './NavIcons';
import { Text } from './Text';
import { useTheme } from './theme';
import { RADIUS } from './tokens';

export interface NoticeProps {
  kind: 'offline' | 'conflict' | 'error' | 'info';
  title: string;
  children?: ReactNode;
  action?: { label: string; onPress: () => void };
  secondAction?: { label: string; onPress: () => void };
}

const FRAME = { offline: 'dashed', conflict: 'solid', error: 'solid', info: 'solid' } as const;

/** Something the person has to know, with what can be done about it. */
export const Notice = ({ kind, title, children, action, secondAction }: NoticeProps) => {
  const { colors } = useTheme();
  return (
    <View role={kind === 'error' ? 'alert' : 'status'} style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: 12, padding: 12, borderWidth: 1, borderStyle: FRAME[kind], borderColor: kind === 'error' ? colors.fail : colors.ink, borderRadius: RADIUS.button, backgroundColor: colors.panel }}>
      {kind === 'offline' ? <OpenContactIcon /> : null}
      {kind === 'error' ? <StatusMark status="fail" silent /> : null}
      <Text style={{ flex: 1, minWidth: 200 }}>
        <Text strong tone={kind === 'error' ? 'fail' : 'ink'}>{title}. </Text>
        {children}
      </Text>
      {secondAction ? <Button {...secondAction} kind="quiet" /> : null}
      {action ? <Button {...action} /> : null}
    </View>
  );
};
