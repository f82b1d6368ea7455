import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/button';
import { PlainTable } from '../../../components/plain-table';
import { Failed, Loading } from '../../../components/states';
import { StatusWord } from '../../../components/status-word';
import { ratingWords } from '../../../wording/rating-words';
import { type Alternate, useAlternates } from '../requests/get-alternates';
import { Quiet, Section } from './section';

type Difference = Alternate['differences'][number];

const shownAtFirst = 8;

const senses = [
  { sense: 'worse', words: 'Worse' },
  { sense: 'different', words: 'Different' },
  { sense: 'unknown', words: 'Not stated by one of the two' },
  { sense: 'better', words: 'Better' },
] as const;

const differenceWords = ({ field, mode, own, alternate }: Difference): string =>
  `${ratingWords(field).toLowerCase()} ${own ?? 'not stated'} → ${alternate ?? 'not stated'}${
    mode === undefined ? '' : ` in the mode “${mode}”`
  }`;

const Line = chakra('p', { base: { fontSize: 'xs', lineHeight: 1.45 } });

/** Whether it is an equal, and if not or if that cannot be said, by which ratings. */
function Judged({ alternate: { judgement, shortfalls } }: { alternate: Alternate }) {
  const known = shortfalls.filter(({ sense }) => sense !== 'unknown');
  const unknown = shortfalls.filter(({ sense }) => sense === 'unknown');
  return (
    <>
      <StatusWord kind="judgement" status={judgement} />
      {known.length > 0 && <Line>{known.map(differenceWords).join('; ')}</Line>}
      {unknown.length > 0 && <Line>Cannot be said for {unknown.map(differenceWords).join('; ')}</Line>}
    </>
  );
}

function Differences({ alternate }: { alternate: Alternate }) {
  if (alternate.differences.length === 0) return <>none</>;
  return senses.map(({ sense, words }) => {
    const found = alternate.differences.filter((difference) => difference.sense === sense);
    if (found.length === 0) return null;
    return (
      <Line key={sense}>
        <chakra.b color={sense === 'worse' ? 'unmet' : undefined} fontWeight="semibold">
          {words}:
        </chakra.b>{' '}
        {found.map(differenceWords).join('; ')}
      </Line>
    );
  });
}

/** What may replace the part: its other sources, and parts of equal form, fit and function; every difference is named. */
export function AlternatesSection({ id, search }: { id: number; search: string }) {
  const alternates = useAlternates(id);
  const [all, setAll] = useState(false);
  const items = alternates.data?.items ?? [];
  return (
    <Section
      title="Alternates"
      note="The other sources under its company part number, equal or not; then parts of equal form, fit and function, and those of which a rating that counts is not stated. Every difference is named, ours first."
    >
      {alternates.isPending && <Loading label="Looking for alternates" lines={3} />}
      {alternates.isError && <Failed error={alternates.error} onRetry={() => void alternates.refetch()} />}
      {alternates.isSuccess && items.length === 0 && <Quiet>The catalogue holds none.</Quiet>}
      {items.length > 0 && (
        <PlainTable
          label="Alternates"
          headers={[
            { words: 'Part' },
            { words: 'Form, fit and function' },
            { words: 'Approval' },
            { words: 'Supply' },
            { words: 'Differences' },
          ]}
        >
          {(all ? items : items.slice(0, shownAtFirst)).map((alternate) => (
            <tr key={alternate.part.id}>
              <td>
                <Link to={`/parts/${alternate.part.id}${search}`}>
                  {alternate.part.manufacturerPartNumber}
                </Link>{' '}
                <small>
                  {alternate.part.manufacturer.name} {alternate.part.family.code}
                  {alternate.mode !== undefined && `, mode “${alternate.mode}”`}
                  {alternate.part.companyPartNumber !== undefined &&
                    `, ${alternate.sameCompanyPartNumber ? 'also ' : ''}${alternate.part.companyPartNumber.number}`}
                </small>
              </td>
              <td>
                <Judged alternate={alternate} />
              </td>
              <td>
                <StatusWord kind="approval" status={alternate.part.approval} />
              </td>
              <td>
                <StatusWord kind="supply" status={alternate.part.supply} />
              </td>
              <td>
                <Differences alternate={alternate} />
              </td>
            </tr>
          ))}
        </PlainTable>
      )}
      {items.length > shownAtFirst && (
        <Button mt={2} onClick={() => setAll(!all)}>
          {all ? 'Show fewer' : `Show ${items.length} of ${alternates.data?.total ?? items.length}`}
        </Button>
      )}
    </Section>
  );
}
