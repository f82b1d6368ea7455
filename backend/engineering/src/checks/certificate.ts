import { knownInputs } from './basis';
import type { CheckDefinition } from './check';
import { unrated, yesOrNo } from './finding';

/** Mains and safety functions ask for a certified type; without a certificate nothing can be said. */
export const certificateCheck: CheckDefinition = {
  name: 'certificate',
  unit: '',
  dependsOn: ['/safety/mains', '/safety/function'],
  variesWithResistance: false,
  asked: (requirement) =>
    requirement.duty.safety?.mains === true || requirement.duty.safety?.function === true,
  find({ conditions }) {
    const certificates = conditions.ratings.certificates ?? [];
    return certificates.length === 0 ? unrated(['certificates']) : yesOrNo(true);
  },
  explain({ conditions }) {
    const { safety } = conditions.requirement.duty;
    const asked = [
      ...(safety?.mains === true ? ['connected to mains'] : []),
      ...(safety?.function === true ? ['safety function'] : []),
    ];
    return {
      words:
        'A position on the mains or with a safety function needs a type certified to the standard in force.',
      inputs: knownInputs(
        { name: 'position', value: asked.join(', '), from: 'duty', field: 'safety' },
        {
          name: 'certificates in date',
          value: conditions.ratings.certificates?.join(', '),
          from: 'ratings',
          field: 'certificates',
        },
      ),
      source: 'the standard in force decides, e.g. IEC 62368-1',
      notes: [
        'Whether the certificate covers this use is for a qualified, where required a licensed, engineer to confirm.',
      ],
    };
  },
};
