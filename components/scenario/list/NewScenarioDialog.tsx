import { useState } from 'react';

import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { Dialog } from '@/components/ui/Dialog';
import { InputWindow } from '@/components/ui/InputWindow';
import { Notice } from '@/components/ui/Notice';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { ApiError } from '@/hooks/api/api-error';
import { errorSentence } from '@/hooks/api/error-sentence';
import type { ScenarioSummary } from '@/shared/contracts/scenario';

import { emptyPath, FIRST_FIGURES, SUPPLIES, type FirstFigures, type SupplyKey } from './empty-path';
import { useMakeScenario } from './useMakeScenario';

const serverIssue = (error: unknown, path: string): string | null => {
  if (!(error instanceof ApiError)) return null;
  return error.details.issues?.find((issue) => issue.path.replace(/^scenario\./, '').startsWith(path))?.message ?? null;
};

/** The few figures that only the person can know; everything else begins with what is named and can be changed on the path. */
export const NewScenarioDialog = ({ scenarios, onClose }: { scenarios: readonly ScenarioSummary[]; onClose: () => void }) => {
  const [name, setName] = useState('');
  const [supply, setSupply] = useState<SupplyKey>('230');
  const [figures, setFigures] = useState<FirstFigures>({ prospectiveCurrent: '', capacitance: '', esr: '', power: '' });
  const [asked, setAsked] = useState(false);
  const { make, making, makeError } = useMakeScenario();
  const taken = scenarios.some((one) => one.name === name.trim());
  const missing = !name.trim() || FIRST_FIGURES.some(({ key }) => !figures[key].trim());
  const submit = () => {
    setAsked(true);
    if (!missing) make(emptyPath(name.trim(), supply, figures));
  };
  const errorOf = (key: keyof FirstFigures, path: string, example: string) => serverIssue(makeError, path) ?? (asked && !figures[key].trim() ? `nothing was written; write for example ${example}` : null);
  const unplaced = makeError && !FIRST_FIGURES.some(({ path }) => serverIssue(makeError, path)) ? makeError : null;
  return (
    <Dialog title="New scenario" open onClose={onClose} actions={<><Button label="Cancel" onPress={onClose} /><Button kind="primary" label="Make the path" busy={making} onPress={submit} /></>}>
      <TextField label="Name" value={name} onChangeText={setName} maxLength={120} autoFocus error={asked && !name.trim() ? 'Give it a name, such as Bench supply 300 W' : null} hint={taken ? 'Another scenario has this name' : ''} />
      <Choice label="Supply" options={SUPPLIES.map(({ key, label }) => ({ value: key, label }))} value={supply} onChange={setSupply} />
      {FIRST_FIGURES.map(({ key, path, label, example }) => (
        <InputWindow key={key} label={label} value={figures[key]} placeholder={example} onChangeText={(text) => setFigures({ ...figures, [key]: text })} error={errorOf(key, path, example)} />
      ))}
      <Text variant="secondary" tone="quiet">It begins without limiter and fuse, with a resistive supply (X/R 0), a bridge of 0.9 V and 20 mΩ a diode on AC, ambient 25 °C, 600 s, and a converter that starts at 70 % of the lowest supply peak. All of it can be changed on the path.</Text>
      {unplaced ? <Notice kind="error" title="Not made">{errorSentence(unplaced)}</Notice> : null}
    </Dialog>
  );
};
