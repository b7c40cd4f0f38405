import type { SaveState } from '@/hooks/scenario/useDraft';

/** In the header, behind the version: how the draft stands towards the server. */
export const saveText = (save: SaveState, issues: number): string => {
  switch (save) {
    case 'saved':
      return 'saved';
    case 'waiting':
      return 'changed';
    case 'saving':
      return 'saving';
    case 'invalid':
      return issues === 1 ? 'kept here, 1 field to correct' : `kept here, ${issues} fields to correct`;
    case 'offline':
      return 'kept here until connected';
    case 'conflict':
      return 'two versions';
    case 'refused':
      return 'kept here, not saved';
  }
};
