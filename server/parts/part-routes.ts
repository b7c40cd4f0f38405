import { partListQuerySchema, partListSchema, partRecordSchema } from '../../shared/contracts/part';
import { idParamsSchema } from '../../shared/contracts/record-id';
import { API } from '../../shared/contracts/routes';
import { guardedRoute, type Route } from '../http/route';
import { PART_POLICY } from './part-policy';

export const partRoutes: readonly Route[] = [
  guardedRoute({
    method: 'get',
    path: API.parts,
    name: 'listParts',
    tag: 'Parts',
    summary: 'Parts of the library, by name',
    who: PART_POLICY.read,
    query: partListQuerySchema,
    answer: { status: 200, description: 'One page', schema: partListSchema },
    handle: async ({ identity, query }, services) => ({ status: 200, body: await services.parts.list(identity, query) }),
  }),
  guardedRoute({
    method: 'get',
    path: API.part(':id'),
    name: 'readPart',
    tag: 'Parts',
    summary: 'Read a part',
    who: PART_POLICY.read,
    params: idParamsSchema,
    answer: { status: 200, description: 'The part with its curve, where its figures come from and where it is used', schema: partRecordSchema },
    problems: ['not-found'],
    handle: async ({ identity, params }, services) => ({ status: 200, body: await services.parts.read(identity, params.id) }),
  }),
];
