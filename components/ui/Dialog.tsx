import type { ReactNode } from 'react';
import { Modal, ScrollView, View } from 'react-native';

import { Text } from './Text';
import { useTheme } from './theme';

export interface DialogProps {
  title: string;
  open: boolean;
  onClose: () => void;
  children: ReactNode;
  /** Buttons at the foot, the main one last. */
  actions?: ReactNode;
  /** Widest it grows, in px. */
  maxWidth?: number;
}

/** A question or a side task over the page; Escape and a press beside it close it. */
export const Dialog = ({ title, open, onClose, children, actions, maxWidth = 560 }: DialogProps) => {
  const { colors } = useTheme();
  return (
    <Modal visible={open} transparent animationType="none" onRequestClose={onClose}>
      <View style={{ flex: 1, justifyContent: 'center', alignItems: 'center', padding: 16 }}>
        <View aria-hidden onPointerUp={onClose} style={{ position: 'absolute', inset: 0, backgroundColor: colors.paper, opacity: 0.8 }} />
        <View role="dialog" aria-modal aria-label={title} style={{ width: '100%', maxWidth, maxHeight: '100%', backgroundColor: colors.paper, borderWidth: 1, borderColor: colors.rule2, borderTopWidth: 4, borderTopColor: colors.ink }}>
          <View style={{ paddingHorizontal: 16, paddingTop: 14, paddingBottom: 8 }}>
            <Text variant="title" strong heading={2}>{title}</Text>
          </View>
          <ScrollView style={{ flexGrow: 0, flexShrink: 1 }} contentContainerStyle={{ paddingHorizontal: 16, paddingBottom: 16, gap: 12 }}>{children}</ScrollView>
          {actions ? <View style={{ flexDirection: 'row', flexWrap: 'wrap', justifyContent: 'flex-end', gap: 8, padding: 16, borderTopWidth: 1, borderTopColor: colors.rule2 }}>{actions}</View> : null}
        </View>
      </View>
    </Modal>
  );
};
