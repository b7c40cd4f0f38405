import { z } from 'zod';

import { CHECKS, type CheckId } from './check-list';

export { CHECKS, type Block, type CheckId } from './check-list';

export const CHECK_IDS = Object.keys(CHECKS) as [CheckId, ...CheckId[]];
export const checkIdSchema = z.enum(CHECK_IDS);
