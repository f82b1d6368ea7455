import { unpackRules } from '@casl/ability/extra';
import { createMongoAbility, subject } from '@casl/ability';
import { abilityOf, type AbilityRule, mayDo } from './ability';
import { ACTIONS, type Action, type Subject, SUBJECTS } from './actions-and-subjects';
import { Person } from './person';
import { refusalOf } from './refusal';
import { type Role, ROLES } from './roles';
import { rules } from './rules';

const ME = 7;
const OTHER = 8;

/** Every state of a thing that a rule asks about. */
const THINGS: [string, Subject, Record<string, unknown>][] = [
  ['a part entered by somebody else', 'Part', { enteredBy: OTHER }],
  ['a part entered by oneself', 'Part', { enteredBy: ME }],
  ['a part that does not say who entered it', 'Part', {}],
  ['a family in draft', 'Family', { state: 'draft' }],
  ['a family in draft, entered by somebody else', 'Family', { state: 'draft', enteredBy: OTHER }],
  ['a family in draft, entered by oneself', 'Family', { state: 'draft', enteredBy: ME }],
  ['a published family', 'Family', { state: 'published' }],
  ['the account of somebody else', 'User', { id: OTHER }],
  ['the own account as an administrator sees it', 'User', { id: ME }],
  ['an account without an id', 'User', {}],
  ['an offer', 'Offer', {}],
  ['a review', 'Review', {}],
  ['a policy', 'Policy', {}],
  ['a policy in draft, entered by somebody else', 'Policy', { state: 'draft', enteredBy: OTHER }],
  ['a policy in draft, entered by oneself', 'Policy', { state: 'draft', enteredBy: ME }],
  ['a published policy', 'Policy', { state: 'published', enteredBy: OTHER }],
  ['a company part number', 'CompanyPartNumber', {}],
  ['a manufacturer', 'Manufacturer', {}],
  ['a search', 'Search', {}],
  ['the own settings', 'Account', {}],
  ['the table of rules', 'Permission', {}],
  ['an audit entry', 'AuditEntry', {}],
  ['a letter', 'Mail', {}],
  ['an undelivered message', 'OutboxMessage', {}],
  ['a backup', 'Backup', {}],
];

/**
 * What each role may do to each thing, written by hand from the product's table of roles; whatever is not here is
 * forbidden. `everybody` holds for all roles.
 */
const ALL = ACTIONS.join(' ');
const ALLOWED: Record<string, Partial<Record<Role | 'everybody', string>>> = {
  'a part entered by somebody else': {
    everybody: 'read',
    librarian: 'create update submit return',
    'component-engineer': 'return approve promote restrict withdraw',
    purchasing: 'set-supply-status set-last-order-date',
  },
  'a part entered by oneself': {
    everybody: 'read',
    librarian: 'create update submit return',
    'component-engineer': 'return',
    purchasing: 'set-supply-status set-last-order-date',
  },
  'a part that does not say who entered it': {
    everybody: 'read',
    librarian: 'create update submit return',
    'component-engineer': 'return',
    purchasing: 'set-supply-status set-last-order-date',
  },
  'a family in draft': { everybody: 'read', librarian: 'create update submit' },
  'a family in draft, entered by somebody else': {
    everybody: 'read',
    librarian: 'create update submit',
    'component-engineer': 'publish',
  },
  'a family in draft, entered by oneself': { everybody: 'read', librarian: 'create update submit' },
  'a published family': { everybody: 'read', librarian: 'create' },
  'the account of somebody else': { administrator: 'read invite change-roles reactivate deactivate' },
  'the own account as an administrator sees it': { administrator: 'read invite change-roles reactivate' },
  'an account without an id': { administrator: 'read invite change-roles reactivate' },
  'an offer': { everybody: 'read', purchasing: ALL },
  'a review': { 'component-engineer': 'read', designer: 'read', purchasing: 'read' },
  'a policy': { everybody: 'read', 'component-engineer': 'create update' },
  'a policy in draft, entered by somebody else': {
    everybody: 'read',
    'component-engineer': 'create update publish',
  },
  'a policy in draft, entered by oneself': { everybody: 'read', 'component-engineer': 'create update' },
  'a published policy': { everybody: 'read', 'component-engineer': 'create update' },
  'a company part number': { everybody: 'read', 'component-engineer': 'create update' },
  'a manufacturer': { everybody: 'read', librarian: 'create update submit' },
  'a search': { everybody: 'read compute' },
  'the own settings': { everybody: ALL },
  'the table of rules': { administrator: 'read' },
  'an audit entry': { administrator: 'read' },
  'a letter': { administrator: 'read' },
  'an undelivered message': { administrator: ALL },
  'a backup': { administrator: ALL },
};

const allowed = (thing: string, role: Role): Set<string> => {
  const { everybody = '', [role]: own = '' } = ALLOWED[thing] ?? {};
  return new Set(`${everybody} ${own}`.trim().split(' '));
};

describe('the rules', () => {
  describe.each(THINGS)('for %s', (name, kind, fields) => {
    it.each(ROLES)('hold for the role %s', (role) => {
      const ability = abilityOf({ id: ME, roles: [role] });
      const permitted = ACTIONS.filter((action) => mayDo(ability, action, kind, fields));
      expect(new Set(permitted)).toEqual(
        new Set(ACTIONS.filter((action) => allowed(name, role).has(action))),
      );
    });
  });

  it('speak of every kind of thing in the table above', () => {
    expect(new Set(THINGS.map(([, kind]) => kind))).toEqual(new Set(SUBJECTS));
  });

  it('allow nothing to whoever holds no role', () => {
    const ability = abilityOf({ id: ME, roles: [] });
    const permitted = SUBJECTS.flatMap((kind) =>
      ACTIONS.filter((action: Action) => ability.can(action, kind)),
    );
    expect(permitted).toEqual([]);
  });

  it('keep four eyes for a person of several roles', () => {
    const ability = abilityOf({ id: ME, roles: [...ROLES] });
    expect(mayDo(ability, 'promote', 'Part', { enteredBy: ME })).toBe(false);
    expect(mayDo(ability, 'promote', 'Part', { enteredBy: OTHER })).toBe(true);
  });

  it('name the rule in a refusal', () => {
    const engineer = new Person(ME, 'Kim', 'kim@example.com', ['component-engineer'], 's');
    const designer = new Person(OTHER, 'Lee', 'lee@example.com', ['designer'], 's');
    expect(() => {
      engineer.demand('promote', 'Part', { enteredBy: ME });
    }).toThrow(refusalOf('promote', 'Part'));
    expect(refusalOf('promote', 'Part').members.rule).toBe('promote Part');
    expect(() => designer.demand('promote', 'Part', { enteredBy: ME })).toThrow(
      'Only a component engineer promotes',
    );
    expect(() => engineer.demand('promote', 'Part', { enteredBy: OTHER })).not.toThrow();
  });

  it('mean the same in the browser, which unpacks them', () => {
    const person = new Person(ME, 'Kim', 'kim@example.com', ['component-engineer', 'librarian'], 's');
    const packed: unknown = JSON.parse(JSON.stringify(person.packedRules()));
    const browser = createMongoAbility(
      unpackRules<AbilityRule>(packed as Parameters<typeof unpackRules<AbilityRule>>[0]),
    );
    for (const [, kind, fields] of THINGS) {
      for (const action of ACTIONS) {
        expect([kind, fields, action, browser.can(action, subject(kind, { ...fields }))]).toEqual([
          kind,
          fields,
          action,
          mayDo(person.ability, action, kind, fields),
        ]);
      }
    }
  });

  it('are each a sentence for people', () => {
    const sentences = rules.map(({ sentence }) => sentence);
    expect(sentences.filter((sentence) => !/^[A-Z].{20,}\.$/.test(sentence))).toEqual([]);
    expect(new Set(sentences).size).toBe(sentences.length);
  });
});
