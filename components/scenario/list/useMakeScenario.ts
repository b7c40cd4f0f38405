import { useRouter } from 'expo-router';

import { newId } from '@/hooks/scenario/new-id';
import { useCreateScenario } from '@/hooks/scenario/useScenarios';
import type { ScenarioRecord } from '@/shared/contracts/scenario';
import type { ScenarioInput } from '@/shared/model/scenario';

const LONGEST_NAME = 120;
const COPY = ', copy';

/** Makes a scenario and goes to it. */
export const useMakeScenario = () => {
  const router = useRouter();
  const create = useCreateScenario();
  const make = (scenario: ScenarioInput) => create.mutate({ id: newId(), scenario }, { onSuccess: ({ id }) => router.push(`/scenarios/${id}`) });
  const clone = ({ scenario }: ScenarioRecord) => make({ ...scenario, name: `${scenario.name.slice(0, LONGEST_NAME - COPY.length)}${COPY}` });
  return { make, clone, making: create.isPending, makeError: create.error, cloneError: create.error };
};
