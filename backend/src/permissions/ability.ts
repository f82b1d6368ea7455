import {
  createMongoAbility,
  type ForcedSubject,
  type MongoAbility,
  type RawRuleOf,
  subject,
} from '@casl/ability';
import type { Action, Subject } from './actions-and-subjects';
import { type Conditions, ONESELF, type PermissionRule } from './rule';
import type { Role } from './roles';
import { rules as allRules } from './rules';

/** The fields of a thing that the conditions of the rules ask about. */
export type Fields = Readonly<Record<string, unknown>>;
export type PersonAbility = MongoAbility<[Action, Subject | (Fields & ForcedSubject<Subject>)]>;
export type AbilityRule = RawRuleOf<PersonAbility>;

/** What a person with these roles may do, after all the rules. Nothing matched means no. */
export function abilityOf(
  person: { id: number; roles: readonly Role[] },
  rules: readonly PermissionRule[] = allRules,
): PersonAbility {
  const held = rules.filter((rule) => rule.roles.some((role) => person.roles.includes(role)));
  return createMongoAbility<PersonAbility>(held.map((rule) => abilityRule(rule, person.id)));
}

/** Whether the person may do this to this very thing. */
export function mayDo(ability: PersonAbility, action: Action, kind: Subject, fields: Fields): boolean {
  // The tag that CASL puts on goes on a copy: what is asked about stays as it is.
  return ability.can(action, subject(kind, { ...fields }));
}

function abilityRule(rule: PermissionRule, personId: number): AbilityRule {
  return {
    action: [...rule.actions],
    subject: [...rule.subjects],
    reason: rule.sentence,
    ...(rule.conditions && { conditions: conditionsFor(rule.conditions, personId) }),
  };
}

function conditionsFor(conditions: Conditions, personId: number): Record<string, Record<string, unknown>> {
  return Object.fromEntries(
    Object.entries(conditions).map(([field, operators]) => [
      field,
      Object.fromEntries(
        Object.entries(operators).map(([operator, operand]) => [
          operator,
          operand === ONESELF ? personId : operand,
        ]),
      ),
    ]),
  );
}
