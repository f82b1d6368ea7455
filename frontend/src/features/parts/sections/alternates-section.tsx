import { chakra } from '@chakra-ui/react';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { Button } from '../../../components/button';
import { Failed, Loading } from '../../../components/states';
import { StatusWord } from '../../../components/status-word';
import { type Alternate, useAlternates } from '../requests/get-alternates';
import { differenceWords } from './difference-words';
import { Quiet, Section } from './section';

const shownAtFirst = 8;

const senses = [
  { sense: 'worse', words: 'Worse', counted: 'worse' },
  { sense: 'different', words: 'Different', counted: 'different' },
  { sense: 'unknown', words: 'Not stated by one of the two', counted: 'not stated by one of the two' },
  { sense: 'better', words: 'Better', counted: 'better' },
] as const;

const List = chakra('ul', {
  base: {
    borderTop: '1px solid',
    borderColor: 'border',
    fontSize: 'sm',
    '& > li': {
      display: 'grid',
      columnGap: 6,
      rowGap: 1,
      gridTemplateColumns: { base: 'minmax(0, 1fr)', md: 'minmax(0, 1.2fr) minmax(0, 1.4fr) 15rem' },
      py: 2,
      borderBottom: '1px solid',
      borderColor: 'border',
    },
    '& > li > details': { gridColumn: '1 / -1', fontSize: 'xs' },
    '& summary': { cursor: 'pointer', color: 'fg.muted' },
    '& small': { color: 'fg.muted', fontSize: 'xs' },
  },
});

const Line = chakra('p', { base: { fontSize: 'xs', lineHeight: 1.5 } });

/** Whether it is an equal, and if not or if that cannot be said, by which ratings. */
function Judged({ alternate: { judgement, shortfalls } }: { alternate: Alternate }) {
  const known = shortfalls.filter(({ sense }) => sense !== 'unknown');
  const unknown = shortfalls.filter(({ sense }) => sense === 'unknown');
  return (
    <div>
      <StatusWord kind="judgement" status={judgement} />
      {known.length > 0 && <Line>{known.map(differenceWords).join('; ')}</Line>}
      {unknown.length > 0 && <Line>Cannot be said for {unknown.map(differenceWords).join('; ')}</Line>}
    </div>
  );
}

function Differences({ differences }: Pick<Alternate, 'differences'>) {
  if (differences.length === 0) return <Quiet>No difference in anything that is stated.</Quiet>;
  const groups = senses
    .map((group) => ({ ...group, found: differences.filter(({ sense }) => sense === group.sense) }))
    .filter(({ found }) => found.length > 0);
  return (
    <details>
      <summary>
        Differences: {groups.map(({ found, counted }) => `${found.length} ${counted}`).join(', ')}
      </summary>
      {groups.map(({ sense, words, found }) => (
        <Line key={sense}>
          <chakra.b color={sense === 'worse' ? 'unmet' : undefined} fontWeight="semibold">
            {words}:
          </chakra.b>{' '}
          {found.map(differenceWords).join('; ')}
        </Line>
      ))}
    </details>
  );
}

function Item({ alternate, search }: { alternate: Alternate; search: string }) {
  const { part, mode, sameCompanyPartNumber } = alternate;
  return (
    <li>
      <div>
        <Link to={`/parts/${part.id}${search}`}>{part.manufacturerPartNumber}</Link>{' '}
        <small>
          {part.manufacturer.name} {part.family.code}
          {mode !== undefined && `, mode “${mode}”`}
          {part.companyPartNumber !== undefined &&
            `, ${sameCompanyPartNumber ? 'also ' : ''}${part.companyPartNumber.number}`}
        </small>
      </div>
      <Judged alternate={alternate} />
      <chakra.div display="flex" gap={5}>
        <StatusWord kind="approval" status={part.approval} />
        <StatusWord kind="supply" status={part.supply} />
      </chakra.div>
      <Differences differences={alternate.differences} />
    </li>
  );
}

/** What may replace the part: its other sources, and parts of equal form, fit and function; every difference is named. */
export function AlternatesSection({ id, search }: { id: number; search: string }) {
  const alternates = useAlternates(id);
  const [all, setAll] = useState(false);
  const items = alternates.data?.items ?? [];
  return (
    <Section
      title="Alternates"
      note="The other sources under its company part number, whatever they lack; then parts of equal form, fit and function, and those of which a rating that counts is not stated. What counts: value, place on the board, tolerance, TCR, voltage, category temperatures, dissipation at every temperature in every mode, and features. Accuracy over life, noise and the rest stand among the differences, ours first."
    >
      {alternates.isPending && <Loading label="Looking for alternates" lines={3} />}
      {alternates.data === undefined && alternates.isError && (
        <Failed error={alternates.error} onRetry={() => void alternates.refetch()} />
      )}
      {alternates.isSuccess && items.length === 0 && <Quiet>The catalogue holds none.</Quiet>}
      {items.length > 0 && (
        <List aria-label="Alternates">
          {(all ? items : items.slice(0, shownAtFirst)).map((alternate) => (
            <Item key={alternate.part.id} alternate={alternate} search={search} />
          ))}
        </List>
      )}
      {items.length > shownAtFirst && (
        <Button mt={2} onClick={() => setAll(!all)}>
          {all ? 'Show fewer' : `Show ${items.length} of ${alternates.data?.total ?? items.length}`}
        </Button>
      )}
    </Section>
  );
}
