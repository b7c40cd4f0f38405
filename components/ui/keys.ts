import { Platform, type ViewProps } from 'react-native';

interface KeyPress {
  key: string;
  preventDefault: () => void;
}

/**
 * Keys of a real keyboard, which React Native's types leave out.
 * @param take answers whether the key was meant for this control; then the page does not scroll by it
 */
export const onKeys = (take: (key: string) => boolean): ViewProps => {
  if (Platform.OS !== 'web') return {};
  const onKeyDown = (event: KeyPress) => {
    if (take(event.key)) event.preventDefault();
  };
  return { onKeyDown } as ViewProps;
};

/** Moves the keyboard to the control with this id, as arrow keys do inside a group. */
export const focusControl = (id: string) => {
  if (Platform.OS === 'web') document.getElementById(id)?.focus();
};
