import { chakra } from '@chakra-ui/react';
import { PlainTable } from '../../../components/plain-table';
import { ratingWords } from '../../../wording/rating-words';
import { rowsFor } from '../rating-rows';
import type { PartDetails } from '../requests/get-part';
import { Section } from './section';

type Citation = PartDetails['citations'][number];

/** A nested field is cited by the one that holds it. */
const citationOf = (citations: readonly Citation[], field: string): Citation | undefined =>
  citations.find((citation) => citation.field === field) ??
  citations.find((citation) => citation.field === field.split('.')[0]);

function Cited({ citation }: { citation: Citation | undefined }) {
  if (citation === undefined) return <small>no citation</small>;
  const { datasheet, page, note } = citation;
  return (
    <small>
      {datasheet.documentNumber}, revision {datasheet.revision}, page {page}
      {note !== undefined && ` (${note})`}
    </small>
  );
}

/** The ratings in each operating mode, each with its place in the datasheet. */
export function RatingsSection({ part }: { part: PartDetails }) {
  const several = part.modes.length > 1;
  const form = [
    ['landPattern', part.landPattern],
    ['termination', part.termination],
    ['soldering', part.soldering],
  ] as const;
  return (
    <Section
      title="Ratings"
      note={several ? 'The operating modes stand side by side and are never mixed.' : undefined}
    >
      <PlainTable
        label="Ratings"
        headers={[
          { words: 'Rating' },
          ...part.modes.map((mode) => ({
            words: mode.name === undefined ? 'As rated' : `Mode: ${mode.name}`,
          })),
          { words: 'Where it stands' },
        ]}
      >
        {rowsFor(part.resistance).map(({ field, words }) => (
          <tr key={field}>
            <th scope="row">{ratingWords(field)}</th>
            {part.modes.map((mode, at) => (
              <td key={mode.name ?? at}>
                {words(mode.ratings) ?? <span className="not-stated">not stated</span>}
              </td>
            ))}
            <chakra.td minWidth="13rem">
              {part.modes.some((mode) => words(mode.ratings) !== undefined) && (
                <Cited citation={citationOf(part.citations, field)} />
              )}
            </chakra.td>
          </tr>
        ))}
        {form.map(([field, value]) => (
          <tr key={field}>
            <th scope="row">{ratingWords(field)}</th>
            <td colSpan={part.modes.length}>{value ?? <span className="not-stated">not stated</span>}</td>
            <td>{value !== undefined && <Cited citation={citationOf(part.citations, field)} />}</td>
          </tr>
        ))}
      </PlainTable>
    </Section>
  );
}
