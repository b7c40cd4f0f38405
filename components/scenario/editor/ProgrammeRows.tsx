import { View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { listAt } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, Section } from './rows';

/** Supply off and on again after the first switch-on, in turn. */
export const ProgrammeRows = () => {
  const { draft, edit } = useEditor();
  const steps = listAt(draft, 'source.programme');
  const add = () => edit('source.programme', [...steps, { at: '', switch: 'off' }, { at: '', switch: 'on' }]);
  return (
    <Section title="Switching programme" remark={steps.length === 0 ? 'stays on' : 'from first switch-on'}>
      {steps.map((_, index) => <QuantityRow key={index} path={`source.programme.${index}.at`} label={index % 2 === 0 ? 'Off at' : 'On again at'} />)}
      {steps.length === 0 ? <Text variant="secondary" tone="quiet">Hot restart is checked in any case; a programme shows one in the traces.</Text> : null}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: 8 }}>
        <BlockButton label="Add off and on" onPress={add} />
        {steps.length > 0 ? <BlockButton label="Take the last away" onPress={() => edit('source.programme', steps.slice(0, -2))} /> : null}
      </View>
    </Section>
  );
};
