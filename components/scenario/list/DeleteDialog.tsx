import { useRouter } from 'expo-router';

import { Button } from '@/components/ui/Button';
import { Dialog } from '@/components/ui/Dialog';
import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { errorSentence } from '@/hooks/api/error-sentence';
import { useDeleteScenario } from '@/hooks/scenario/useScenarios';
import type { ScenarioSummary } from '@/shared/contracts/scenario';

/** Asks before a scenario is gone for the whole team. */
export const DeleteDialog = ({ summary, onClose }: { summary: ScenarioSummary; onClose: () => void }) => {
  const router = useRouter();
  const remove = useDeleteScenario();
  const finish = () => {
    router.setParams({ selected: undefined });
    onClose();
  };
  return (
    <Dialog
      title="Delete this scenario?"
      open
      onClose={onClose}
      actions={
        <>
          <Button label="Keep it" onPress={onClose} />
          <Button kind="primary" label="Delete" busy={remove.isPending} onPress={() => remove.mutate(summary.id, { onSuccess: finish })} />
        </>
      }
    >
      <Text><Text strong>{summary.name}</Text>, draft {summary.version}, is taken away for everybody in the team. This cannot be undone.</Text>
      {remove.error ? <Notice kind="error" title="Not deleted">{errorSentence(remove.error)}</Notice> : null}
    </Dialog>
  );
};
