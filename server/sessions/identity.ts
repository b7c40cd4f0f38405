import type { Role, Session } from '../../shared/contracts/session';
import type { Person } from '../teams/person-entity';

/** A caller who is known: read from the database at every request, so that a role taken away is gone at once. */
export interface Identity {
  personId: string;
  name: string;
  email: string;
  roles: readonly Role[];
  team: { id: string; name: string };
  by: { kind: 'session'; sessionId: string } | { kind: 'token' };
}

/** What must be joined to make an identity of a person. */
export const WITH_TEAM_AND_ROLES = { team: true, grants: true } as const;

export const identityOf = (person: Person, by: Identity['by']): Identity => ({
  personId: person.id,
  name: person.name,
  email: person.email,
  roles: person.grants.map((grant) => grant.role),
  team: { id: person.team.id, name: person.team.name },
  by,
});

const initialsOf = (name: string): string => {
  const words = name.split(/\s+/).filter(Boolean);
  const letters = [words[0], words.length > 1 ? words[words.length - 1] : undefined].map((word) => (word ? [...word][0] : ''));
  return letters.join('').toUpperCase();
};

export const presentSession = (identity: Identity): Session => ({
  user: {
    id: identity.personId,
    name: identity.name,
    initials: initialsOf(identity.name),
    email: identity.email,
    roles: [...identity.roles],
  },
  team: identity.team,
});
