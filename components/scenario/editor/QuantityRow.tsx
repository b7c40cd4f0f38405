import type { ReactNode } from 'react';

import { InputWindow } from '@/components/ui/InputWindow';
import { Quantity } from '@/components/ui/Quantity';
import { nodeAt, type DraftNode } from '@/hooks/scenario/draft-tree';
import { fieldAt, type Field } from '@/hooks/scenario/field-table';
import { asTyped } from '@/hooks/scenario/notation';
import { DIMENSIONS, type Dimension, type Qualifier } from '@/shared/quantity/dimension';

import { detached } from './detached';
import { useEditor } from './editor-context';
import { useWantedField } from './useWantedField';

interface LeafRowProps {
  /** Where the value stands in the draft. */
  path: string;
  label: string;
  dimension: Dimension;
  qualifier?: Qualifier | undefined;
  optional?: boolean | undefined;
  /** In place of the plain echo. */
  echo?: ReactNode;
  /** A message that belongs to this row though it is filed under another path. */
  error?: string | undefined;
  /** What stands there while the draft holds nothing at the path. */
  fallback?: number | undefined;
  onWrite: (value: DraftNode) => void;
}

const textOf = (node: DraftNode, dimension: Dimension): string => {
  if (typeof node === 'number') return asTyped(node, dimension);
  return typeof node === 'string' ? node : '';
};

/** One window for one number, kept as it was typed. */
export const LeafRow = ({ path, label, dimension, qualifier, optional, echo, error, fallback, onWrite }: LeafRowProps) => {
  const { draft, issues, reader, prepare, readOnly } = useEditor();
  const field = useWantedField(path);
  const node = nodeAt(draft, path) ?? fallback;
  const value = typeof node === 'number' ? node : (reader?.valueAt(draft, path, dimension) ?? null);
  const plain = value === null ? null : <Quantity value={value} dimension={dimension} kind={qualifier ?? null} variant="secondary" tone="quiet" />;
  const unit = dimension === 'temperature' ? '°C' : DIMENSIONS[dimension].unit;
  return (
    <InputWindow
      label={[label, unit && qualifier ? `, ${unit} ${qualifier}` : ''].join('')}
      value={textOf(node, dimension)}
      onChangeText={(text) => onWrite(text === '' && optional ? undefined : text)}
      onFocus={prepare}
      echo={echo ?? plain}
      error={issues.get(path) ?? error ?? null}
      placeholder={optional ? 'not given' : ''}
      readOnly={readOnly}
      inputRef={field}
    />
  );
};

/** The row of a quantity that the field table knows; figures of a library part lose their library name when changed. */
export const QuantityRow = ({ path, label }: { path: string; label?: string }) => {
  const { draft, edit } = useEditor();
  const field = fieldAt(draft, path);
  if (!field) throw new Error(`no field is listed at ${path}`);
  const rest: Pick<Field, 'dimension' | 'qualifier' | 'optional'> = field;
  return <LeafRow path={path} label={label ?? field.label} {...rest} onWrite={(value) => edit(path, value, detached(draft, path))} />;
};
