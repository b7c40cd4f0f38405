import { View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { listAt, nodeAt } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, Section } from './rows';

const CurveRows = () => {
  const { draft, edit } = useEditor();
  const points = listAt(draft, 'fuse.preArcing');
  return (
    <Section title="Pre-arcing curve" remark="minimum, not typical">
      {points.length === 0 ? <Text variant="secondary" tone="quiet">No figure: the running I²t is not assessed.</Text> : null}
      {points.map((_, index) => (
        <View key={index}>
          <QuantityRow path={`fuse.preArcing.${index}.time`} label={`Point ${index + 1}, time`} />
          <QuantityRow path={`fuse.preArcing.${index}.i2t`} label={`Point ${index + 1}, I²t`} />
        </View>
      ))}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: 8 }}>
        <BlockButton label="Add a point" onPress={() => edit('fuse.preArcing', [...points, { time: points.length === 0 ? '10m' : '', i2t: '' }])} />
        {points.length > 0 ? <BlockButton label="Take the last away" onPress={() => edit('fuse.preArcing', points.slice(0, -1))} /> : null}
      </View>
    </Section>
  );
};

/** The fuse ahead of the limiter, or none. */
export const FuseEditor = () => {
  const { draft, edit } = useEditor();
  if (nodeAt(draft, 'fuse') === undefined) {
    return (
      <Section title="Fuse">
        <Text tone="quiet">The path has no fuse, so no fuse is checked.</Text>
        <BlockButton label="Add a fuse" onPress={() => edit('fuse', { ratedCurrent: '', preArcing: [] })} />
      </Section>
    );
  }
  return (
    <View style={{ gap: 14 }}>
      <Section title="Fuse">
        <QuantityRow path="fuse.ratedCurrent" />
        <QuantityRow path="fuse.deratedCurrent" />
        <QuantityRow path="fuse.breakingCapacity" />
        <QuantityRow path="fuse.pulseFactor" />
        <QuantityRow path="fuse.resistance" />
      </Section>
      <CurveRows />
      <BlockButton label="Take the fuse away" onPress={() => edit('fuse', undefined)} />
    </View>
  );
};
