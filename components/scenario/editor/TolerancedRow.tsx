import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Text } from '@/components/ui/Text';
import { isBranch, nodeAt, type Draft, type DraftNode } from '@/hooks/scenario/draft-tree';
import { fieldAt, type Field } from '@/hooks/scenario/field-table';
import type { Dimension } from '@/shared/quantity/dimension';
import { formatQuantity } from '@/shared/quantity/format';

import { detached } from './detached';
import { useEditor } from './editor-context';
import { LeafRow } from './QuantityRow';

type Band = { readonly [key: string]: DraftNode };

const bandAt = (draft: Draft, path: string): Band => {
  const node = nodeAt(draft, path);
  return isBranch(node) ? node : { nominal: node };
};

/** A tolerance is told as a share, or in kelvin for a temperature, where the band is symmetric; else by its two ends. */
const toleranceOf = ({ nominal, min, max, tolerance }: Band, dimension: Dimension): DraftNode | 'ends' => {
  if (tolerance !== undefined) return tolerance;
  if (min === undefined && max === undefined) return 0;
  if (typeof nominal !== 'number' || typeof min !== 'number' || typeof max !== 'number') return 'ends';
  const [below, above] = [nominal - min, max - nominal];
  if (Math.abs(below - above) > 1e-9 * Math.max(Math.abs(nominal), 1)) return 'ends';
  const share = dimension === 'temperature' || nominal === 0 ? above : above / nominal;
  return Number(share.toPrecision(9));
};

const useBandEnds = (path: string) => {
  const { scenario } = useEditor();
  const band = nodeAt(scenario as object as Draft, path);
  return isBranch(band) && typeof band.min === 'number' && typeof band.max === 'number' ? { min: band.min, max: band.max } : null;
};

export interface TolerancedRowProps {
  path: string;
  label?: string;
  /** Names of the lowest and the highest value. */
  ends?: readonly [string, string];
  /** Always told by its ends, never by a tolerance. */
  alwaysEnds?: boolean;
  /** The person may change between tolerance and ends. */
  switchable?: boolean;
}

/** A quantity with its tolerance, or with its lowest and highest value where these lie unevenly. */
export const TolerancedRow = (props: TolerancedRowProps) => {
  const { draft } = useEditor();
  const field = fieldAt(draft, props.path);
  if (!field) throw new Error(`no field is listed at ${props.path}`);
  const tolerance = props.alwaysEnds ? 'ends' : toleranceOf(bandAt(draft, props.path), field.dimension);
  return tolerance === 'ends' ? <EndsRows {...props} field={field} /> : <ToleranceRows {...props} field={field} tolerance={tolerance} />;
};

const Switch = ({ label, name, onPress }: { label: string; name: string; onPress: () => void }) => {
  const { readOnly } = useEditor();
  if (readOnly) return null;
  return <View style={{ alignSelf: 'flex-end' }}><Button kind="quiet" label={label} spoken={`${name}: ${label.toLowerCase()}`} onPress={onPress} /></View>;
};

const EndsRows = ({ path, label, field, ends: names = ['Lowest', 'Highest'], alwaysEnds, switchable }: TolerancedRowProps & { field: Field }) => {
  const { draft, edit, issues } = useEditor();
  const band = bandAt(draft, path);
  const full = { nominal: band.nominal, min: band.min ?? band.nominal, max: band.max ?? band.nominal };
  const write = (next: Band) => edit(path, next, detached(draft, path));
  const rows = { dimension: field.dimension, qualifier: field.qualifier };
  const name = label ?? field.label;
  return (
    <View>
      <LeafRow {...rows} path={`${path}.nominal`} label={name} error={issues.get(path)} onWrite={(nominal) => write({ ...full, nominal })} />
      <LeafRow {...rows} path={`${path}.min`} label={names[0]} onWrite={(min) => write({ ...full, min })} />
      <LeafRow {...rows} path={`${path}.max`} label={names[1]} onWrite={(max) => write({ ...full, max })} />
      {switchable && !alwaysEnds ? <Switch label="As a tolerance" name={name} onPress={() => write({ nominal: band.nominal, tolerance: 0 })} /> : null}
    </View>
  );
};

const ToleranceRows = ({ path, label, field, tolerance, switchable }: TolerancedRowProps & { field: Field; tolerance: DraftNode }) => {
  const { draft, edit, issues } = useEditor();
  const ends = useBandEnds(path);
  const { nominal } = bandAt(draft, path);
  const write = (next: Band) => edit(path, next, detached(draft, path));
  const { dimension, qualifier } = field;
  const name = label ?? field.label;
  const spread = ends && ends.max > ends.min ? `${formatQuantity(ends.min, dimension, 3)} to ${formatQuantity(ends.max, dimension, 3)}` : 'no spread';
  return (
    <View>
      <LeafRow dimension={dimension} qualifier={qualifier} path={isBranch(nodeAt(draft, path)) ? `${path}.nominal` : path} label={name} error={issues.get(path)} onWrite={(next) => write({ nominal: next, tolerance })} />
      <LeafRow
        path={`${path}.tolerance`}
        label={`${name}, ±`}
        dimension={dimension === 'temperature' ? 'temperatureInterval' : 'ratio'}
        fallback={typeof tolerance === 'number' ? tolerance : undefined}
        echo={<Text variant="secondary" tone="quiet">{spread}</Text>}
        onWrite={(next) => write({ nominal, tolerance: next === '' ? 0 : next })}
      />
      {switchable ? <Switch label="As lowest and highest" name={name} onPress={() => write({ nominal, min: ends?.min ?? nominal, max: ends?.max ?? nominal })} /> : null}
    </View>
  );
};
