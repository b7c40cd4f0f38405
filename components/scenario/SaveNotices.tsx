import { useState } from 'react';
import { View } from 'react-native';

import { Notice } from '@/components/ui/Notice';
import type { DraftControls } from '@/hooks/scenario/useDraft';

import { ConflictDialog } from './ConflictDialog';

const clock = (iso: string) => new Date(iso).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });

/** What stands between the draft and its being saved, with the way out. */
export const SaveNotices = ({ controls }: { controls: DraftControls }) => {
  const { conflict, refusal, retrySave, draft } = controls;
  const [comparing, setComparing] = useState(false);
  const differs = conflict && conflict.differences.length > 0 ? conflict : null;
  if (!differs && !refusal) return null;
  return (
    <View style={{ padding: 8, gap: 8 }}>
      {differs ? (
        <Notice kind="conflict" title={`${differs.by} saved this scenario at ${clock(differs.at)}`} action={{ label: 'Compare', onPress: () => setComparing(true) }}>
          {differs.differences.length === 1 ? 'One field differs' : `${differs.differences.length} fields differ`} from yours. Nothing was overwritten; your edits are kept here until you choose.
        </Notice>
      ) : null}
      {refusal ? <Notice kind="error" title="Not saved" action={{ label: 'Try again', onPress: retrySave }}>{refusal} Your edits are kept in this browser.</Notice> : null}
      {differs && comparing ? <ConflictDialog draft={draft} conflict={differs} onClose={() => setComparing(false)} /> : null}
    </View>
  );
};
