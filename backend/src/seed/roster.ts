import type { Role } from '../permissions/roles';
import type { Deed } from './family';
import type { SeedPerson } from './reading/read-people';

/** The people of the seed data with the ids of their accounts; refuses a deed that its doer could not have done. */
export class Roster {
  private readonly byAddress: ReadonlyMap<string, { person: SeedPerson; id: number }>;

  constructor(people: readonly { person: SeedPerson; id: number }[]) {
    this.byAddress = new Map(people.map((entry) => [entry.person.address, entry]));
  }

  /** @throws RangeError for somebody who is not in people.json */
  readonly idOf = (address: string): number => this.entryOf(address).id;

  nameOf(address: string): string {
    return this.entryOf(address).person.name;
  }

  /**
   * @returns the id of the account
   * @throws RangeError where the person does not hold the role, or was not there on that day
   */
  didAs(role: Role, deed: Deed): number {
    const { person, id } = this.entryOf(deed.by);
    if (!person.roles.includes(role)) throw new RangeError(`${deed.by} is no ${role}`);
    if (deed.on < person.joined || (person.left !== null && deed.on > person.left)) {
      throw new RangeError(`${deed.by} did not work here on ${deed.on}`);
    }
    return id;
  }

  private entryOf(address: string): { person: SeedPerson; id: number } {
    const entry = this.byAddress.get(address);
    if (!entry) throw new RangeError(`nobody has the address ${address}`);
    return entry;
  }
}
