import type { Change } from '@/hooks/scenario/draft-state';
import { nodeAt, type Draft } from '@/hooks/scenario/draft-tree';

/** A figure typed over makes the part the person's own: it is no longer what the library holds. */
export const detached = (draft: Draft, path: string): readonly Change[] => {
  const part = /^limiter\.\d+\.part(?=\.(law|thermal|ratings))/.exec(path)?.[0];
  return part && nodeAt(draft, `${part}.libraryId`) !== undefined ? [[`${part}.libraryId`, undefined]] : [];
};
