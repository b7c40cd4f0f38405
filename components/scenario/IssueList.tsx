import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { StatusMark } from '@/components/ui/Marks';
import { Text } from '@/components/ui/Text';
import { fieldAt } from '@/hooks/scenario/field-table';
import type { Draft } from '@/hooks/scenario/draft-tree';
import type { Issues } from '@/hooks/scenario/read-draft';

const MOST = 4;
const labelOf = (draft: Draft, path: string) => (fieldAt(draft, path) ?? fieldAt(draft, path.replace(/\.(nominal|min|max|tolerance)$/, '')))?.label ?? path;

/** Fields that cannot be used yet: until they are put right, the result is the one before. */
export const IssueList = ({ draft, issues, onGoTo }: { draft: Draft; issues: Issues; onGoTo: (path: string) => void }) => {
  if (issues.size === 0) return null;
  return (
    <View role="group" aria-label="Fields to correct" style={{ paddingHorizontal: 16, paddingVertical: 8, gap: 2 }}>
      {[...issues].slice(0, MOST).map(([path, message]) => (
        <View key={path} style={{ flexDirection: 'row', alignItems: 'center', gap: 8 }}>
          <StatusMark status="fail" silent size={14} />
          <Text variant="secondary" style={{ flex: 1 }}><Text variant="secondary" strong>{labelOf(draft, path)}:</Text> {message}</Text>
          <Button kind="quiet" label="Go" spoken={`Go to ${labelOf(draft, path)}`} onPress={() => onGoTo(path)} />
        </View>
      ))}
      {issues.size > MOST ? <Text variant="secondary" tone="quiet">and {issues.size - MOST} more</Text> : null}
    </View>
  );
};
