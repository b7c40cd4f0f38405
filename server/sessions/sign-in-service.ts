import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';

import type { SignIn } from '../../shared/contracts/session';
import { ProblemError } from '../http/problem-error';
import { Person } from '../teams/person-entity';
import { type Identity, identityOf, WITH_TEAM_AND_ROLES } from './identity';
import type { Passwords } from './passwords';
import type { IssuedTokens } from './session-cookies';
import type { SessionService } from './session-service';
import type { SignInLimit } from './sign-in-limit';

export class SignInService {
  constructor(
    private readonly database: DataSource,
    private readonly passwords: Passwords,
    private readonly limit: SignInLimit,
    private readonly sessions: SessionService,
    private readonly log: Logger,
  ) {}

  /** An unknown account, a deactivated one and a wrong password look alike from outside, in words and in time. */
  async signIn({ email, password }: SignIn, address: string): Promise<{ identity: Identity; tokens: IssuedTokens }> {
    const account = email.toLowerCase();
    const attempt = await this.limit.attempt(account, address);
    const [person] = await this.database.getRepository(Person).find({ where: { email: account }, relations: WITH_TEAM_AND_ROLES });
    const matches = await this.passwords.matches(password, person?.passwordHash ?? null);
    if (!person || !matches || !person.active) {
      this.log.warn({ address, personId: person?.id ?? null }, 'sign-in refused');
      throw new ProblemError('wrong-credentials', 'Check the e-mail address and the password.');
    }
    await attempt.succeeded();
    const { sessionId, ...tokens } = await this.sessions.start(person.id);
    this.log.info({ address, personId: person.id }, 'signed in');
    return { identity: identityOf(person, { kind: 'session', sessionId }), tokens };
  }
}
