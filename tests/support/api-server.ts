import { hashSync } from 'bcryptjs';
import { randomUUID } from 'node:crypto';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import pino from 'pino';
import supertest, { type Test } from 'supertest';
import type { DataSource } from 'typeorm';

import { type Composed, compose, type Settings } from '../../server/compose';
import { createDataSource } from '../../server/database/data-source';
import { Person, RoleGrant } from '../../server/teams/person-entity';
import { Team } from '../../server/teams/team-entity';
import { ROLES, type Role } from '../../shared/contracts/session';
import { createTestDatabase } from './database';

export const PASSWORD = 'a long enough test password';
/** The least that bcrypt takes, so that tests do not spend their time on hashing. */
const PASSWORD_HASH = hashSync(PASSWORD, 4);

export interface TestPerson {
  id: string;
  teamId: string;
  email: string;
  name: string;
}

type Method = 'get' | 'post' | 'put' | 'delete';

/** A team with one person for each role, another team with one person who holds all roles, and the whole server over HTTP. */
export class ApiServer {
  private constructor(
    readonly database: DataSource,
    readonly composed: Composed,
    readonly url: string,
    readonly people: Record<Role, TestPerson>,
    readonly stranger: TestPerson,
    private readonly time: { offset: number },
    private readonly end: () => Promise<void>,
  ) {}

  static async start({ throughCable, ...settings }: Partial<Settings> & { throughCable?: (direct: string) => Promise<string> } = {}): Promise<ApiServer> {
    const created = await createTestDatabase();
    const log = pino({ level: 'silent' });
    const database = createDataSource((await throughCable?.(created.url)) ?? created.url, log);
    await database.initialize();
    const time = { offset: 0 };
    const clock = () => new Date(Date.now() + time.offset);
    const composed = compose({ database, sessionSecret: 's'.repeat(32), staticDir: null, log, clock, ...settings });
    const server = await new Promise<Server>((resolve) => {
      const listening = composed.app.listen(0, '127.0.0.1', () => resolve(listening));
    });
    const url = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
    const people = await addTeam(database, 'Home', ROLES.map((role) => [role]));
    const [stranger] = await addTeam(database, 'Elsewhere', [[...ROLES]]);
    const byRole = Object.fromEntries(ROLES.map((role, index) => [role, people[index]!])) as Record<Role, TestPerson>;
    return new ApiServer(database, composed, url, byRole, stranger!, time, async () => {
      server.closeAllConnections();
      await new Promise((resolve) => server.close(resolve));
      await composed.close();
      await database.destroy();
      await created.drop();
    });
  }

  stop(): Promise<void> {
    return this.end();
  }

  /** Lets time pass for sessions and tokens. */
  wait(milliseconds: number): void {
    this.time.offset += milliseconds;
  }

  /** A request from the app's own pages; `who` is a Cookie header, or null for nobody. */
  send(method: Method, path: string, who: string | null, body?: object): Test {
    const request = supertest(this.url)[method](path).set('Sec-Fetch-Site', 'same-origin');
    if (who !== null) request.set('Cookie', who);
    return body === undefined ? request : request.send(body);
  }

  withToken(method: Method, path: string, token: string, body?: object): Test {
    const request = supertest(this.url)[method](path).set('Authorization', `Bearer ${token}`);
    return body === undefined ? request : request.send(body);
  }

  /** @returns the Cookie header of a new session */
  async signIn(person: TestPerson): Promise<string> {
    const answer = await this.send('post', '/api/session', null, { email: person.email, password: PASSWORD }).expect(201);
    return cookiesOf(answer.headers);
  }
}

/** What a browser would send back after this answer; cookies that were cleared are left out. */
export const cookiesOf = (headers: Record<string, unknown>): string => {
  const set = (headers['set-cookie'] ?? []) as string[];
  return set.map((line) => line.split(';')[0]!).filter((pair) => !pair.endsWith('=')).join('; ');
};

/** One cookie out of a Cookie header. */
export const only = (cookies: string, part: 'access' | 'refresh'): string => cookies.split('; ').filter((pair) => pair.startsWith(`__Host-tidegate-${part}=`)).join('; ');

export const addTeam = async (database: DataSource, name: string, rolesOfEach: Role[][]): Promise<TestPerson[]> => {
  const createdAt = new Date();
  const teamId = randomUUID();
  await database.getRepository(Team).insert({ id: teamId, name, createdAt });
  const people = rolesOfEach.map((roles) => ({ id: randomUUID(), teamId, name: `${name} ${roles.join(' ')}`, email: `${randomUUID()}@test.example`, roles }));
  await database.getRepository(Person).insert(people.map(({ id, email, name: personName }) => ({ id, teamId, email, name: personName, passwordHash: PASSWORD_HASH, createdAt })));
  await database.getRepository(RoleGrant).insert(people.flatMap(({ id, roles }) => roles.map((role) => ({ personId: id, role }))));
  return people;
};
