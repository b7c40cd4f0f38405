import type { Page } from './EditorPanel';
import type { BlockKey } from './strip-blocks';

export interface EditorPlace {
  page: Page;
  block: BlockKey;
}

const BLOCKS: Record<string, BlockKey> = { source: 'source', fuse: 'fuse', limiter: 'limiter.0', rectifier: 'rectifier', bulk: 'bulk', load: 'load', fault: 'load' };

/** Where in the editor the field at a path is found. */
export const placeOfPath = (path: string): EditorPlace => {
  const [head = '', index] = path.split('.');
  if (head === 'limits' || head === 'cautionBelow') return { page: 'limits', block: 'source' };
  const block = head === 'limiter' && index === '1' ? 'limiter.1' : BLOCKS[head];
  return block ? { page: 'block', block } : { page: 'conditions', block: 'source' };
};
