import { ROLES, type Role } from '../../shared/contracts/session';

/**
 * Everybody in the team reads its scenarios; designers own them. An admin looks after people, not
 * designs: one who designs as well holds both roles.
 */
export const SCENARIO_POLICY = {
  read: ROLES,
  write: ['designer'],
} as const satisfies Record<string, readonly Role[]>;

export const mayWriteScenarios = (roles: readonly Role[]): boolean => SCENARIO_POLICY.write.some((role) => roles.includes(role));
