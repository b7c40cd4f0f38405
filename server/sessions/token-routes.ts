import { idParamsSchema } from '../../shared/contracts/record-id';
import { API } from '../../shared/contracts/routes';
import { createdTokenSchema, createTokenSchema, ROLES, tokenListSchema } from '../../shared/contracts/session';
import { ProblemError } from '../http/problem-error';
import { guardedRoute, type Route } from '../http/route';

export const tokenRoutes: readonly Route[] = [
  guardedRoute({
    method: 'get',
    path: API.tokens,
    name: 'listTokens',
    tag: 'Tokens',
    summary: 'Your tokens that are still good',
    who: ROLES,
    sessionOnly: true,
    answer: { status: 200, description: 'Newest first, without their secrets', schema: tokenListSchema },
    handle: async ({ identity }, services) => ({ status: 200, body: { tokens: await services.tokens.list(identity) } }),
  }),
  guardedRoute({
    method: 'post',
    path: API.tokens,
    name: 'createToken',
    tag: 'Tokens',
    summary: 'Make a token for a program',
    description: 'It acts as you, with the roles that you have when it is used. Send it in the header Authorization, after the word Bearer. The secret is shown only now.',
    who: ROLES,
    sessionOnly: true,
    body: createTokenSchema,
    answer: { status: 201, description: 'The token with its secret', schema: createdTokenSchema },
    handle: async ({ identity, body }, services) => ({ status: 201, body: await services.tokens.create(identity, body) }),
  }),
  guardedRoute({
    method: 'delete',
    path: API.token(':id'),
    name: 'revokeToken',
    tag: 'Tokens',
    summary: 'Revoke a token',
    who: ROLES,
    sessionOnly: true,
    params: idParamsSchema,
    answer: { status: 204, description: 'It opens nothing any more', schema: null },
    problems: ['not-found'],
    handle: async ({ identity, params }, services) => {
      if (!(await services.tokens.revoke(identity, params.id))) throw new ProblemError('not-found', 'You have no such token.');
      return { status: 204 };
    },
  }),
];
