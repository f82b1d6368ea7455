import { chakra } from '@chakra-ui/react';
import { type BodyMarking } from '@resistry/engineering/marking/body-marking';
import { markingsFor } from '@resistry/engineering/marking/markings-for';
import { DrawnPart } from '../../../components/drawn-part/drawn-part';
import { bodyOfPart } from '../../search/results/part-figures';
import type { PartDetails } from '../requests/get-part';
import { Quiet, Section } from './section';

/** What each band stands for, first to last: digits, multiplier, tolerance, temperature coefficient. */
function bandWords(count: number, at: number): string {
  if (count === 1) return 'link';
  const digits = count >= 5 ? 3 : 2;
  if (at < digits) return ['first digit', 'second digit', 'third digit'][at] ?? '';
  return ['multiplier', 'tolerance', 'temperature coefficient'][at - digits] ?? '';
}

function inWords(marking: BodyMarking): string {
  switch (marking.kind) {
    case 'characters':
      return `It bears the characters ${marking.text}.`;
    case 'bands': {
      const { bands } = marking;
      return `It bears the bands ${bands.map((colour, at) => `${colour} (${bandWords(bands.length, at)})`).join(', ')}.`;
    }
    case 'none':
    case 'unknown':
      return marking.reason;
  }
}

/** The marking as the component bears it, and the other forms that say the same value. */
export function MarkingSection({ part }: { part: PartDetails }) {
  const body = bodyOfPart(part);
  const others = markingsFor(part);
  return (
    <Section title="Marking">
      {body === undefined ? (
        <Quiet>The datasheet gives no size of the body, so what it bears is not drawn.</Quiet>
      ) : (
        <chakra.div display="flex" gap={4} alignItems="center" flexWrap="wrap">
          <DrawnPart body={body} size="page" labelled />
          <chakra.p fontSize="sm" flex="1 1 14rem">
            {inWords(body.marking)}
          </chakra.p>
        </chakra.div>
      )}
      {others.ok && (
        <chakra.p fontSize="xs" color="fg.muted" mt={2}>
          The same value by IEC 60062:{' '}
          {others.forms.map((form) => ('text' in form ? form.text : form.bands.join(' '))).join('; ')}. By
          usual practice; the datasheet decides.
        </chakra.p>
      )}
    </Section>
  );
}
