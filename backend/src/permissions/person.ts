import { type PackRule, packRules } from '@casl/ability/extra';
import { abilityOf, type AbilityRule, type Fields, mayDo, type PersonAbility } from './ability';
import type { Action, Subject } from './actions-and-subjects';
import { refusalOf } from './refusal';
import type { Role } from './roles';

/** Somebody who is signed in: the actor of every change. */
export class Person {
  readonly ability: PersonAbility;

  constructor(
    readonly id: number,
    readonly name: string,
    readonly email: string,
    readonly roles: readonly Role[],
    /** The sign-in that this request belongs to. */
    readonly sessionId: string,
  ) {
    this.ability = abilityOf({ id, roles });
  }

  /** Whether some rule might allow this, depending on the thing. */
  mightDo(action: Action, subject: Subject): boolean {
    return this.ability.can(action, subject);
  }

  /**
   * Insists that this person may do this to this very thing.
   *
   * @param fields what the conditions of the rules ask about, such as `enteredBy`
   * @throws ForbiddenProblem naming the rule
   */
  demand(action: Action, subject: Subject, fields: Fields): void {
    if (!mayDo(this.ability, action, subject, fields)) throw refusalOf(action, subject);
  }

  /** The rules in the short form that the browser unpacks. */
  packedRules(): PackRule<AbilityRule>[] {
    return packRules(this.ability.rules);
  }
}
