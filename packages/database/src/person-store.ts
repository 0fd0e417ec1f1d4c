import type { Role } from '@leeside/contracts/roles';
import type { Database } from './open-database.js';

export interface Person {
  readonly id: string;
  readonly labId: string;
  readonly labName: string;
  readonly clientId: string | null;
  readonly name: string;
  readonly email: string;
  readonly passwordHash: string;
  readonly isDisabled: boolean;
  readonly roles: Role[];
}

interface PersonRow {
  id: string;
  lab_id: string;
  lab_name: string;
  client_id: string | null;
  name: string;
  email: string;
  password_hash: string;
  disabled_at: string | null;
  roles: Role[];
}

const people = (db: Database) => db('people').join('labs', 'labs.id', 'people.lab_id').select(
  'people.*', 'labs.name as lab_name', db.raw('array(select role from person_roles where person_id = people.id order by role) as roles'));

const personOf = (row: PersonRow): Person => ({
  id: row.id, labId: row.lab_id, labName: row.lab_name, clientId: row.client_id, name: row.name, email: row.email,
  passwordHash: row.password_hash, isDisabled: row.disabled_at !== null, roles: row.roles,
});

/** The person with an e-mail address, whatever its case. */
export async function findPersonByEmail(db: Database, email: string): Promise<Person | null> {
  const row: PersonRow | undefined = await people(db).whereRaw('lower(people.email) = lower(?)', [email]).first();
  return row ? personOf(row) : null;
}

export async function findPerson(db: Database, personId: string): Promise<Person | null> {
  const row: PersonRow | undefined = await people(db).where('people.id', personId).first();
  return row ? personOf(row) : null;
}

export interface NewPerson {
  readonly labId: string;
  readonly clientId?: string;
  readonly name: string;
  readonly email: string;
  readonly passwordHash: string;
  readonly roles: readonly Role[];
}

/** Adds a person; `client` belongs to one client and excludes every other role. */
export async function createPerson(db: Database, person: NewPerson): Promise<string> {
  const isClient = person.roles.includes('client');
  if (isClient !== (person.clientId !== undefined) || (isClient && person.roles.length > 1)) throw new Error('The role client belongs to one client and excludes all others.');
  const [row]: { id: string }[] = await db('people').insert({
    lab_id: person.labId, client_id: person.clientId ?? null, name: person.name, email: person.email, password_hash: person.passwordHash,
  }).returning('id');
  if (!row) throw new Error('The person was not kept.');
  await db('person_roles').insert(person.roles.map((role) => ({ lab_id: person.labId, person_id: row.id, role })));
  return row.id;
}

/** Keeps a password's new hash. */
export async function changePasswordHash(db: Database, personId: string, passwordHash: string): Promise<void> {
  await db('people').where({ id: personId }).update({ password_hash: passwordHash });
}

/** Whether a lab has an administrator yet. */
export async function hasAdmin(db: Database, labId: string): Promise<boolean> {
  const row: unknown = await db('person_roles').where({ lab_id: labId, role: 'admin' }).first('person_id');
  return row !== undefined;
}
