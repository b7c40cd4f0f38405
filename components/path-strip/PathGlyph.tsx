import { View } from 'react-native';

import type { PathGlyph as Path } from '@/shared/contracts/scenario';

/** The path of a scenario in a list, one 30 × 26 glyph a block. */
export const PathGlyph = (_: { path: Path; faint?: boolean }) => <View style={{ height: 26 }} />;
