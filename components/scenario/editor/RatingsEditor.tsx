import { View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { nodeAt, type DraftNode } from '@/hooks/scenario/draft-tree';

import { detached } from './detached';
import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, PickRow, Section } from './rows';

const BASES = [
  { value: 'absorbed', label: 'Absorbed' },
  { value: 'half-cv2-rms', label: '½CV², V rms' },
  { value: 'half-cv2-peak', label: '½CV², V peak' },
  { value: 'unknown', label: 'Not stated' },
] as const;

interface GroupProps {
  path: string;
  name: string;
  missing: string;
  /** The ratings of a library part are added to and taken from in the library. */
  typed: boolean;
  blank: DraftNode;
  children: React.ReactNode;
}

/** A rating with its conditions, or the word that it is missing. */
const RatingGroup = ({ path, name, missing, typed, blank, children }: GroupProps) => {
  const { draft, edit } = useEditor();
  const change = (value: DraftNode) => edit(path, value, detached(draft, path));
  if (nodeAt(draft, path) === undefined) {
    return (
      <View style={{ gap: 4 }}>
        <Text variant="secondary" tone="quiet">{missing}</Text>
        {typed ? <BlockButton label={`Add ${name}`} onPress={() => change(blank)} /> : null}
      </View>
    );
  }
  return (
    <View style={{ gap: 4 }}>
      {children}
      {typed ? <BlockButton label={`Take ${name} away`} onPress={() => change(undefined)} /> : null}
    </View>
  );
};

const EnergyGroup = ({ base, typed }: { base: string; typed: boolean }) => {
  const { draft, edit } = useEditor();
  const path = `${base}.energy`;
  const basis = BASES.find(({ value }) => value === nodeAt(draft, `${path}.basis`))?.value ?? 'unknown';
  return (
    <RatingGroup path={path} typed={typed} name="an energy rating" missing="No energy rating: the pulse is not assessed by energy." blank={{ energy: '', basis: 'unknown' }}>
      <QuantityRow path={`${path}.energy`} />
      <PickRow label="The energy is" options={BASES} value={basis} onPick={(next) => edit(`${path}.basis`, next, detached(draft, path))} />
      <QuantityRow path={`${path}.startTemperature`} />
      <QuantityRow path={`${path}.pulses`} />
    </RatingGroup>
  );
};

const CapacitanceGroup = ({ base, typed }: { base: string; typed: boolean }) => {
  const { draft, edit } = useEditor();
  const path = `${base}.capacitance`;
  const peak = nodeAt(draft, `${path}.voltageIs`) === 'peak';
  return (
    <RatingGroup path={path} typed={typed} name="a capacitance rating" missing="No capacitance rating." blank={{ capacitance: '', voltage: '', voltageIs: 'rms' }}>
      <QuantityRow path={`${path}.capacitance`} />
      <QuantityRow path={`${path}.voltage`} />
      <PickRow label="The voltage is" options={[{ value: 'rms', label: 'V rms' }, { value: 'peak', label: 'V peak' }]} value={peak ? 'peak' : 'rms'} onPick={(next) => edit(`${path}.voltageIs`, next, detached(draft, path))} />
    </RatingGroup>
  );
};

/** What the part's record allows; each missing figure leaves its check not assessed. */
export const RatingsEditor = ({ base, typed }: { base: string; typed: boolean }) => {
  const { draft } = useEditor();
  const kind = nodeAt(draft, base.replace(/ratings$/, 'kind'));
  const polymer = kind === 'polymer-ptc';
  return (
    <Section title="Ratings of the part">
      <QuantityRow path={`${base}.maximumTemperature`} />
      {polymer ? (
        <>
          <QuantityRow path={`${base}.maximumVoltage`} />
          <QuantityRow path={`${base}.maximumCurrent`} />
        </>
      ) : (
        <View style={{ gap: 12 }}>
          <RatingGroup path={`${base}.steadyCurrent`} typed={typed} name="a steady current" missing="No steady current rating." blank={{ current: '', ambient: '' }}>
            <QuantityRow path={`${base}.steadyCurrent.current`} />
            <QuantityRow path={`${base}.steadyCurrent.ambient`} />
          </RatingGroup>
          <EnergyGroup base={base} typed={typed} />
          <CapacitanceGroup base={base} typed={typed} />
        </View>
      )}
    </Section>
  );
};
