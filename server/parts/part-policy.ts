import { ROLES, type Role } from '../../shared/contracts/session';

/** The whole team reads its library. */
export const PART_POLICY = { read: ROLES } as const satisfies Record<string, readonly Role[]>;
