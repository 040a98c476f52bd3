import { type Membership, type Role } from '@/lib/schemas/vocabulary';

/** Who acts: a signed-in person. */
export type Actor = { id: string; role: Role; email: string; name: string | null };

const everyMember: Membership[] = ['owner', 'co-owner', 'caretaker', 'contractor'];
const keepers: Membership[] = ['owner', 'co-owner'];

/** What a person may do to a home, by what they are to it. */
const homePolicy = {
  'home.view': everyMember,
  'home.edit': keepers,
  'work.log': everyMember,
  'work.remove': keepers,
  'work.putOff': keepers,
  'home.share': ['owner'],
  'home.archive': ['owner'],
} satisfies Record<string, Membership[]>;

/** What a person may do by their role alone. */
const rolePolicy = {
  'home.create': ['homeowner'],
  'job.view': ['contractor'],
  'mail.view': ['operator'],
  'mail.retry': ['operator'],
} satisfies Record<string, Role[]>;

export type HomeVerb = keyof typeof homePolicy;
export type RoleVerb = keyof typeof rolePolicy;
export const homeVerbs = Object.keys(homePolicy) as HomeVerb[];
export const roleVerbs = Object.keys(rolePolicy) as RoleVerb[];

export const isRoleVerb = (verb: string): verb is RoleVerb => verb in rolePolicy;

/** What `can` needs to know of a record: the actor's membership in its home, and who made the record. */
export type Subject = { membership?: Membership | undefined; createdBy?: string | null | undefined };

/** The whole policy. Somebody who logged a piece of work may take it back; the rest is in the two tables. */
export function can(actor: Actor, verb: HomeVerb | RoleVerb, subject: Subject = {}): boolean {
  if (isRoleVerb(verb)) return (rolePolicy[verb] as Role[]).includes(actor.role);
  if (!subject.membership) return false;
  if (verb === 'work.remove' && subject.createdBy === actor.id) return true;
  return (homePolicy[verb] as Membership[]).includes(subject.membership);
}

/** Stands for whoever is not signed in, where that is allowed. */
export const nobody: Actor = { id: '', role: 'homeowner', email: '', name: null };

/** Thrown by the data layer; wrappers and pages turn it into 404 or 403. */
export class Refused extends Error {
  constructor(
    readonly reason: 'not found' | 'not allowed',
    what: string,
  ) {
    super(reason === 'not found' ? `${what} was not found` : `${what}: not allowed`);
    this.name = 'Refused';
  }
}
