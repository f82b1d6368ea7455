import { knownInputs } from './basis';
import type { CheckDefinition, Finding } from './check';
import { holds, unrated, yesOrNo } from './finding';

const sides = ['length', 'width', 'height'] as const;

/** Fits: the part's side that comes nearest to its limit, or passes it, stands as the demand. */
export const bodyCheck: CheckDefinition = {
  name: 'body',
  unit: 'm',
  dependsOn: ['/body/length', '/body/width', '/body/height'],
  variesWithResistance: false,
  asked: (requirement) => Object.keys(requirement.duty.body ?? {}).length > 0,
  find({ conditions }): Finding {
    const largest = conditions.requirement.duty.body ?? {};
    const body = conditions.ratings.body;
    if (body === undefined) return unrated(['body']);
    let tightest: { size: number; limit: number } | undefined;
    for (const side of sides) {
      const limit = largest[side];
      if (limit === undefined) continue;
      const size = body[side];
      if (tightest === undefined || size / limit > tightest.size / tightest.limit) tightest = { size, limit };
    }
    if (tightest === undefined) return unrated(['body']);
    return yesOrNo(holds(tightest.size, tightest.limit), tightest.size, tightest.limit);
  },
  explain({ conditions }) {
    const { ratings, requirement } = conditions;
    return {
      words: 'Largest length, width and height of the body against the room there is.',
      inputs: sides.flatMap((side) =>
        knownInputs(
          {
            name: `largest ${side} of the body`,
            value: ratings.body?.[side],
            unit: 'm',
            from: 'ratings',
            field: `body.${side}`,
          },
          {
            name: `room for the ${side}`,
            value: requirement.duty.body?.[side],
            unit: 'm',
            from: 'duty',
            field: `body.${side}`,
          },
        ),
      ),
      source: 'dimensions of the datasheet',
      notes: ['The land pattern and the room to solder are not part of this check.'],
    };
  },
};
