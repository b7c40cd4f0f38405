import { useState, type ReactNode } from 'react';
import { View } from 'react-native';

/** Draws its content once it knows how wide it may be, for plots that are drawn to the pixel. */
export const Measured = ({ children, height }: { children: (width: number) => ReactNode; height: number }) => {
  const [width, setWidth] = useState(0);
  return (
    <View style={{ alignSelf: 'stretch', minHeight: height }} onLayout={(event) => setWidth(Math.floor(event.nativeEvent.layout.width))}>
      {width > 0 ? children(width) : null}
    </View>
  );
};
