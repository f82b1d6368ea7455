import type { Action, Subject } from './actions-and-subjects';
import type { Role } from './roles';

/** Stands in a condition for the id of the person who asks. */
export const ONESELF = '{oneself}';

type Operand = string | number | boolean | readonly string[];

/** Conditions on the fields of the thing itself, in CASL's query words; all must hold. */
export type Conditions = Readonly<
  Record<string, Readonly<Partial<Record<'$eq' | '$ne' | '$in' | '$exists', Operand>>>>
>;

/** Who may do what with what, as data; nothing is allowed that no rule allows. */
export interface PermissionRule {
  roles: readonly Role[];
  actions: readonly Action[];
  subjects: readonly Subject[];
  conditions?: Conditions;
  /** The rule for people: shown in the table of rules and in a refusal. */
  sentence: string;
}
