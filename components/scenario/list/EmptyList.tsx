import { View } from 'react-native';

import { PathGlyph } from '@/components/path-strip/PathGlyph';
import { Button } from '@/components/ui/Button';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import type { PathGlyph as Path } from '@/shared/contracts/scenario';

const FAINT: Path = { source: 'ac', fuse: true, elements: [{ kind: 'ntc', bypass: false }], rectifier: 'bridge', load: 'constant-power' };

/** Nothing to list: a faint path, and the way to a first scenario. */
export const EmptyList = ({ search, mayDesign, onNew }: { search: string; mayDesign: boolean; onNew: () => void }) => {
  const { colors } = useTheme();
  const searched = search.trim() !== '';
  return (
    <View role="status" style={{ margin: 16, padding: 16, gap: 10, alignItems: 'flex-start', borderWidth: 1, borderStyle: 'dashed', borderColor: colors.rule2, borderRadius: 6, backgroundColor: colors.panel }}>
      <PathGlyph path={FAINT} faint />
      <Text variant="title" strong>{searched ? 'No scenario of that name' : 'No scenario yet'}</Text>
      <Text tone="quiet">{searched ? 'Shorten or clear the search.' : 'Start from an empty path.'}</Text>
      {mayDesign && !searched ? <Button kind="primary" label="Empty path" onPress={onNew} /> : null}
    </View>
  );
};
