import { useState } from 'react';

import { TextField } from '@/components/ui/TextField';
import { listAt, nodeAt, type DraftNode } from '@/hooks/scenario/draft-tree';
import { asTyped } from '@/hooks/scenario/notation';
import type { Dimension } from '@/shared/quantity/dimension';

import { detached } from './detached';
import { useEditor } from './editor-context';

const shown = (node: DraftNode, dimension: Dimension) => (typeof node === 'number' ? asTyped(node, dimension) : String(node ?? ''));

/** `25 °C  10k` on each line: the first number with its unit is the temperature, the rest the resistance. */
const pointOf = (line: string): DraftNode => {
  const match = /^\s*([+\-\u2212]?[\d.,]+\s*(?:°\s*C|C|K)?)[\s;]+(.*)$/.exec(line);
  return match ? { temperature: match[1]?.trim(), resistance: match[2]?.trim() } : { temperature: line.trim(), resistance: '' };
};

/** A maker's R–T table, typed or pasted with one point on a line. */
export const TableField = ({ path }: { path: string }) => {
  const { draft, edit, issues, prepare, readOnly } = useEditor();
  const [typed, setTyped] = useState<string | null>(null);
  const points = listAt(draft, path);
  const text = points.map((_, at) => `${shown(nodeAt(draft, `${path}.${at}.temperature`), 'temperature')} °C  ${shown(nodeAt(draft, `${path}.${at}.resistance`), 'resistance')}`.replace(/(°\s?C|K) °C/, '$1')).join('\n');
  const issue = [...issues].find(([at]) => at === path || at.startsWith(`${path}.`));
  const line = issue ? /\.(\d+)\./.exec(issue[0].slice(path.length)) : null;
  const write = (next: string) => {
    prepare();
    setTyped(next);
    edit(path, next.split('\n').filter((one) => one.trim() !== '').map(pointOf), detached(draft, path));
  };
  return (
    <TextField label="R–T table, a point on each line" multiline value={typed ?? text} onChangeText={write} onBlur={() => setTyped(null)} readOnly={readOnly}
      hint={`${points.length} points; such as 25 °C  10k`} error={issue ? `${line ? `Line ${Number(line[1]) + 1}: ` : ''}${issue[1]}` : null} />
  );
};
