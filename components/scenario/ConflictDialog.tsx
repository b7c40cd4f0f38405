import { useState } from 'react';
import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Dialog } from '@/components/ui/Dialog';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import type { Difference } from '@/hooks/scenario/draft-difference';
import { isBranch, type Draft, type DraftNode } from '@/hooks/scenario/draft-tree';
import { fieldAt } from '@/hooks/scenario/field-table';
import type { Conflict } from '@/hooks/scenario/useDraft';
import { formatQuantity } from '@/shared/quantity/format';

type Side = 'mine' | 'theirs';
const SIDES = [{ value: 'mine', label: 'Mine' }, { value: 'theirs', label: 'Theirs' }] as const;

const BLOCKS: Record<string, string> = {
  name: 'Name', notes: 'Notes', source: 'Supply', fuse: 'Fuse', limiter: 'Limiter', rectifier: 'Rectifier', bulk: 'Bulk capacitor', load: 'Load', fault: 'Fault', limits: 'Limits', setAside: 'Checks set aside',
};

const labelOf = (draft: Draft, path: string) => fieldAt(draft, path)?.label ?? BLOCKS[path] ?? `${BLOCKS[path.split('.')[0] ?? ''] ?? path}, ${path.split('.').slice(1).join(' ')}`;

const partName = (node: Draft): string | null => {
  if (typeof node.name === 'string') return node.name;
  return isBranch(node.part) ? partName(node.part) : null;
};

/** A value as the two people would read it. */
const valueText = (draft: Draft, path: string, node: DraftNode): string => {
  const field = fieldAt(draft, path);
  if (node === undefined) return 'not given';
  if (typeof node === 'number' && field) return formatQuantity(node, field.dimension);
  if (isBranch(node) && typeof node.nominal === 'number' && field) {
    const ends = typeof node.min === 'number' && typeof node.max === 'number' ? ` (${formatQuantity(node.min, field.dimension)} to ${formatQuantity(node.max, field.dimension)})` : '';
    return `${formatQuantity(node.nominal, field.dimension)}${ends}`;
  }
  if (Array.isArray(node)) return node.length === 0 ? 'none' : `${node.length} entries`;
  return isBranch(node) ? (partName(node) ?? String(node.kind ?? node.law ?? node.when ?? 'given')) : String(node);
};

const WHO: Record<Difference['changedBy'], string> = { me: 'you changed it', them: 'they changed it', both: 'both changed it' };

const DifferenceRow = ({ draft, one, side, onPick }: { draft: Draft; one: Difference; side: Side; onPick: (side: Side) => void }) => {
  const { colors } = useTheme();
  const label = labelOf(draft, one.path);
  return (
    <View role="listitem" style={{ gap: 4, paddingVertical: 8, borderBottomWidth: 1, borderBottomColor: colors.rule }}>
      <Text strong>{label} <Text variant="secondary" tone="quiet">{WHO[one.changedBy]}</Text></Text>
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', justifyContent: 'space-between', gap: 8 }}>
        <Text variant="label">mine {valueText(draft, one.path, one.mine)}, theirs {valueText(draft, one.path, one.theirs)}</Text>
        <Choice label={label} hideLabel options={SIDES} value={side} onChange={onPick} />
      </View>
    </View>
  );
};

export interface ConflictDialogProps {
  draft: Draft;
  conflict: Conflict;
  onClose: () => void;
}

/** Two people changed the same draft: every field that differs, with both values; nothing is overwritten until one is chosen. */
export const ConflictDialog = ({ draft, conflict, onClose }: ConflictDialogProps) => {
  const [picked, setPicked] = useState<Readonly<Record<string, Side>>>({});
  const sideOf = (one: Difference): Side => picked[one.path] ?? (one.changedBy === 'them' ? 'theirs' : 'mine');
  const theirs = new Set(conflict.differences.filter((one) => sideOf(one) === 'theirs').map(({ path }) => path));
  const finish = () => {
    conflict.resolve((path) => theirs.has(path));
    onClose();
  };
  return (
    <Dialog title="Two versions of this draft" open onClose={onClose} maxWidth={620} actions={<><Button label="Later" onPress={onClose} /><Button kind="primary" label="Go on with these" onPress={finish} /></>}>
      <Text>{conflict.by} saved this scenario while you were editing it. Nothing was overwritten. Choose for each field that differs:</Text>
      <View role="list">
        {conflict.differences.map((one) => <DifferenceRow key={one.path} draft={draft} one={one} side={sideOf(one)} onPick={(side) => setPicked({ ...picked, [one.path]: side })} />)}
      </View>
    </Dialog>
  );
};
