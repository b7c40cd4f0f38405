import { View } from 'react-native';

/** The scale above a list of margin bars: 0, 50, rating 100 %, 150. */
export const MarginRuler = () => <View style={{ height: 15 }} />;
