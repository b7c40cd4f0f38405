import type { Request, Response } from 'express';
import type { z } from 'zod';

import type { Role } from '../../shared/contracts/session';
import type { ErrorCode } from '../../shared/error-codes';
import type { Services } from '../services';
import type { Identity } from '../sessions/identity';

export interface Reply {
  status: 200 | 201 | 204;
  body?: unknown;
  location?: string;
}

/** What a handler gets: everything parsed, the caller known and allowed. */
export interface Call<Params, Query, Body> {
  params: Params;
  query: Query;
  body: Body;
  request: Request;
  response: Response;
  /** Aborts when the client hangs up. */
  signal: AbortSignal;
}

export interface RouteDescription<Params extends z.ZodType, Query extends z.ZodType, Body extends z.ZodType> {
  method: 'get' | 'post' | 'put' | 'delete';
  /** As Express writes it, such as /api/scenarios/:id. */
  path: string;
  /** Name of the operation for programs, such as saveScenario. */
  name: string;
  tag: string;
  summary: string;
  description?: string;
  params?: Params;
  query?: Query;
  body?: Body;
  /** The answer when all goes well; null where it has no body. */
  answer: { status: Reply['status']; description: string; schema: z.ZodType | null };
  /** Problems of its own, beside those that every route of its kind can answer with. */
  problems?: readonly ErrorCode[];
}

export interface PublicRoute<P extends z.ZodType = z.ZodType, Q extends z.ZodType = z.ZodType, B extends z.ZodType = z.ZodType>
  extends RouteDescription<P, Q, B> {
  who: 'anyone';
  handle(call: Call<z.output<P>, z.output<Q>, z.output<B>>, services: Services): Promise<Reply>;
}

export interface GuardedRoute<P extends z.ZodType = z.ZodType, Q extends z.ZodType = z.ZodType, B extends z.ZodType = z.ZodType>
  extends RouteDescription<P, Q, B> {
  /** One of these roles is needed. */
  who: readonly Role[];
  /** Refused to bearer tokens, so that a leaked token cannot make itself successors. */
  sessionOnly?: boolean;
  handle(call: Call<z.output<P>, z.output<Q>, z.output<B>> & { identity: Identity }, services: Services): Promise<Reply>;
}

export type Route = PublicRoute | GuardedRoute;

/** Both give the handler the types of its schemas; `mount` sees to it that they hold. */
export const publicRoute = <P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType>(route: PublicRoute<P, Q, B>): Route => route;
export const guardedRoute = <P extends z.ZodType, Q extends z.ZodType, B extends z.ZodType>(route: GuardedRoute<P, Q, B>): Route => route;
