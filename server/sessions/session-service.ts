import { randomUUID } from 'node:crypto';
import type { DataSource, EntityManager } from 'typeorm';
import type { Logger } from 'pino';
import { IsNull, LessThan } from 'typeorm';

import type { Clock } from '../clock';
import { signAccessToken, verifyAccessToken } from './access-token';
import { type Identity, identityOf, WITH_TEAM_AND_ROLES } from './identity';
import { createOpaqueToken, hashOpaqueToken } from './opaque-token';
import { RefreshToken } from './refresh-token-entity';
import type { IssuedTokens, SessionCookies } from './session-cookies';
import { type SessionEnd, SessionRow } from './session-entity';
import { SESSION_LIMITS } from './session-limits';

export interface Resumed {
  identity: Identity;
  /** New tokens for the client, where they were due. */
  renewed: IssuedTokens | null;
}

/**
 * A session is a row; the access token only saves looking up the refresh token for ten minutes.
 * The row is read at every request, so that an ended session is over at the next one.
 */
export class SessionService {
  constructor(
    private readonly database: DataSource,
    private readonly secret: string,
    private readonly clock: Clock,
    private readonly log: Logger,
  ) {}

  async start(personId: string): Promise<IssuedTokens & { refresh: string; sessionId: string }> {
    const now = this.clock();
    const sessionId = randomUUID();
    const refresh = await this.database.transaction(async (manager) => {
      await manager.delete(SessionRow, { personId, expiresAt: LessThan(now) });
      const expiresAt = new Date(now.getTime() + SESSION_LIMITS.absolute);
      await manager.insert(SessionRow, { id: sessionId, personId, createdAt: now, lastSeenAt: now, expiresAt });
      return this.addRefreshToken(manager, sessionId, now);
    });
    return { access: signAccessToken(sessionId, this.secret, now), refresh, sessionId };
  }

  /** @returns who it is, or null where the session is over or was never there */
  async resume(cookies: SessionCookies): Promise<Resumed | null> {
    const now = this.clock();
    const sessionId = cookies.access === null ? null : verifyAccessToken(cookies.access, this.secret, now);
    if (sessionId !== null) {
      const identity = await this.identify(sessionId, now);
      return identity && { identity, renewed: null };
    }
    return cookies.refresh === null ? null : this.renew(cookies.refresh, now);
  }

  async end(sessionId: string, because: SessionEnd): Promise<void> {
    await this.database.getRepository(SessionRow).update({ id: sessionId, endedAt: IsNull() }, { endedAt: this.clock(), endedBecause: because });
  }

  private async renew(refresh: string, now: Date): Promise<Resumed | null> {
    const turned = await this.database.transaction((manager) => this.rotate(manager, refresh, now));
    if (!turned) return null;
    const identity = await this.identify(turned.sessionId, now);
    const access = signAccessToken(turned.sessionId, this.secret, now);
    return identity && { identity, renewed: { access, refresh: turned.successor } };
  }

  /**
   * Hands out the successor of a refresh token, once. Whoever comes with the old one within the grace
   * gets an access token only; later, the token was copied, and the whole session ends.
   */
  private async rotate(manager: EntityManager, refresh: string, now: Date): Promise<{ sessionId: string; successor: string | null } | null> {
    const presented = await manager.findOne(RefreshToken, { where: { hash: hashOpaqueToken(refresh) }, lock: { mode: 'pessimistic_write' } });
    if (!presented) return null;
    const { sessionId } = presented;
    if (presented.replacedAt === null) {
      await manager.update(RefreshToken, { id: presented.id }, { replacedAt: now });
      return { sessionId, successor: await this.addRefreshToken(manager, sessionId, now) };
    }
    if (now.getTime() - presented.replacedAt.getTime() <= SESSION_LIMITS.reuseGrace) return { sessionId, successor: null };
    await manager.update(SessionRow, { id: sessionId, endedAt: IsNull() }, { endedAt: now, endedBecause: 'token-reused' });
    this.log.warn({ sessionId }, 'a used refresh token came back; its session is ended');
    return null;
  }

  private async addRefreshToken(manager: EntityManager, sessionId: string, now: Date): Promise<string> {
    const token = createOpaqueToken();
    await manager.insert(RefreshToken, { id: randomUUID(), sessionId, hash: hashOpaqueToken(token), createdAt: now });
    return token;
  }

  private async identify(sessionId: string, now: Date): Promise<Identity | null> {
    const sessions = this.database.getRepository(SessionRow);
    const [session] = await sessions.find({ where: { id: sessionId, endedAt: IsNull() }, relations: { person: WITH_TEAM_AND_ROLES } });
    if (!session || !session.person.active || session.expiresAt <= now) return null;
    const quiet = now.getTime() - session.lastSeenAt.getTime();
    if (quiet > SESSION_LIMITS.idle) {
      await this.end(sessionId, 'idle');
      return null;
    }
    if (quiet >= SESSION_LIMITS.lastSeenStep) await sessions.update({ id: sessionId }, { lastSeenAt: now });
    return identityOf(session.person, { kind: 'session', sessionId });
  }
}
