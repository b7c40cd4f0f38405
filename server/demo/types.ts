import type { PartRecord } from '../../shared/contracts/part';
import type { Role } from '../../shared/contracts/session';
import type { PartInput } from '../../shared/model/part';
import type { ScenarioInput } from '../../shared/model/scenario';

/** An invented person who can sign in. The `id` is fixed, so that seeding twice makes nobody twice. */
export interface DemoAccount {
  id: string;
  name: string;
  email: string;
  roles: readonly [Role, ...Role[]];
}

/** An invented library part; figures as an engineer writes them. */
export interface DemoPart {
  /** uuid, fixed; a scenario that took the part names it as `part.libraryId`. */
  id: string;
  part: PartInput;
  provenance: PartRecord['provenance'];
}

/** An invented scenario, in the order in which the list is to show them (first on top). */
export interface DemoScenario {
  /** uuid, fixed. */
  id: string;
  scenario: ScenarioInput;
}
