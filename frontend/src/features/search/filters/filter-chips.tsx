import { chakra } from '@chakra-ui/react';
import { Button } from '../../../components/button';
import { type FindState, filterNames, flagNames } from '../find-address';
import { useFacets } from '../requests/get-facets';
import type { ChangeFind } from '../use-find-state';
import { filterChoices, filterWords, flagWords } from './filter-choices';
import { withoutFilters } from './without-filters';

interface Chip {
  words: string;
  remove: (state: FindState) => FindState;
}

const Chips = chakra('ul', {
  base: {
    display: 'flex',
    flexWrap: 'wrap',
    gap: 1.5,
    alignItems: 'center',
    py: 2,
    '& button[data-chip]': {
      border: '1px solid',
      borderColor: 'border.field',
      borderRadius: 'sm',
      bg: 'bg.field',
      px: 2,
      minHeight: 6,
      fontSize: 'xs',
      maxWidth: '18rem',
      overflow: 'hidden',
      textOverflow: 'ellipsis',
      whiteSpace: 'nowrap',
    },
    '& button[data-chip]:hover': { borderColor: 'accent', color: 'accent' },
  },
});

export interface FilterChipsProps extends Pick<FindState, 'text' | 'filters' | 'flags'> {
  onChange: ChangeFind;
}

/** What the list is narrowed to, each to be taken away again. */
export function FilterChips({ text, filters, flags, onChange }: FilterChipsProps) {
  const facets = useFacets();
  const choices = facets.data && filterChoices(facets.data, { ...filters, manufacturer: [] });
  const chips: Chip[] = [
    ...(text === ''
      ? []
      : [{ words: `Named “${text}”`, remove: (before: FindState) => ({ ...before, text: '' }) }]),
    ...filterNames.flatMap((name) =>
      filters[name].map((value): Chip => {
        const words = choices?.[name].find((choice) => choice.value === value)?.words ?? value;
        return {
          words: `${filterWords[name]}: ${words}`,
          remove: (before) => ({
            ...before,
            filters: { ...before.filters, [name]: before.filters[name].filter((each) => each !== value) },
          }),
        };
      }),
    ),
    ...flagNames
      .filter((name) => flags[name])
      .map((name): Chip => ({
        words: flagWords[name],
        remove: (before) => ({ ...before, flags: { ...before.flags, [name]: false } }),
      })),
  ];
  if (chips.length === 0) return null;
  return (
    <Chips aria-label="Only these parts are looked at">
      {chips.map(({ words, remove }) => (
        <li key={words}>
          <button type="button" data-chip="" title={words} onClick={() => onChange(remove)}>
            <chakra.span srOnly>Take away: </chakra.span>
            {words} <span aria-hidden="true">✕</span>
          </button>
        </li>
      ))}
      {chips.length > 1 && (
        <li>
          <Button variant="plain" onClick={() => onChange(withoutFilters)}>
            Take all away
          </Button>
        </li>
      )}
    </Chips>
  );
}
