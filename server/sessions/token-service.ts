import { randomUUID } from 'node:crypto';
import { type DataSource, IsNull, MoreThan } from 'typeorm';
import type { z } from 'zod';

import type { createdTokenSchema, createTokenSchema, tokenSchema } from '../../shared/contracts/session';
import type { Clock } from '../clock';
import { ApiToken } from './api-token-entity';
import { type Identity, identityOf, WITH_TEAM_AND_ROLES } from './identity';
import { createOpaqueToken, hashOpaqueToken } from './opaque-token';
import { SESSION_LIMITS } from './session-limits';

type TokenView = z.output<typeof tokenSchema>;

const DAY = 86_400_000;
/** Makes a leaked token findable in text. */
const PREFIX = 'tidegate_';

const present = (token: ApiToken): TokenView => ({
  id: token.id,
  name: token.name,
  createdAt: token.createdAt.toISOString(),
  expiresAt: token.expiresAt.toISOString(),
  lastUsedAt: token.lastUsedAt?.toISOString() ?? null,
});

/** Bearer tokens that a person makes for programs; each acts as that person, with their roles of the moment. */
export class TokenService {
  constructor(
    private readonly database: DataSource,
    private readonly clock: Clock,
  ) {}

  async create(identity: Identity, wanted: z.output<typeof createTokenSchema>): Promise<z.output<typeof createdTokenSchema>> {
    const now = this.clock();
    const secret = `${PREFIX}${createOpaqueToken()}`;
    const token = this.tokens.create({
      id: randomUUID(),
      personId: identity.personId,
      name: wanted.name,
      hash: hashOpaqueToken(secret),
      createdAt: now,
      expiresAt: new Date(now.getTime() + wanted.days * DAY),
      lastUsedAt: null,
      revokedAt: null,
    });
    await this.tokens.insert(token);
    return { ...present(token), secret };
  }

  /** Those that still open something, newest first. */
  async list(identity: Identity): Promise<TokenView[]> {
    const where = { personId: identity.personId, revokedAt: IsNull(), expiresAt: MoreThan(this.clock()) };
    return (await this.tokens.find({ where, order: { createdAt: 'DESC', id: 'DESC' } })).map(present);
  }

  /** @returns false where the person has no such token */
  async revoke(identity: Identity, id: string): Promise<boolean> {
    const { affected } = await this.tokens.update({ id, personId: identity.personId, revokedAt: IsNull() }, { revokedAt: this.clock() });
    return affected === 1;
  }

  async identify(secret: string): Promise<Identity | null> {
    const now = this.clock();
    const where = { hash: hashOpaqueToken(secret), revokedAt: IsNull(), expiresAt: MoreThan(now) };
    const [token] = await this.tokens.find({ where, relations: { person: WITH_TEAM_AND_ROLES } });
    if (!token || !token.person.active) return null;
    const unseen = now.getTime() - (token.lastUsedAt?.getTime() ?? 0);
    if (unseen >= SESSION_LIMITS.lastSeenStep) await this.tokens.update({ id: token.id }, { lastUsedAt: now });
    return identityOf(token.person, { kind: 'token' });
  }

  private get tokens() {
    return this.database.getRepository(ApiToken);
  }
}
