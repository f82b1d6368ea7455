import { chakra } from '@chakra-ui/react';
import { memo } from 'react';
import { Failed, Loading } from '../../../components/states';
import { type FindState, filterNames, flagNames } from '../find-address';
import { type Facets, useFacets } from '../requests/get-facets';
import type { ChangeFind } from '../use-find-state';
import { filterChoices, filterWords, flagWords } from './filter-choices';
import { FilterGroup } from './filter-group';

export interface FilterPanelProps extends Pick<FindState, 'filters' | 'flags'> {
  onChange: ChangeFind;
}

/** What narrows the catalogue beside the duty; the numbers are those of the whole catalogue. */
export const FilterPanel = memo(function FilterPanel({ filters, flags, onChange }: FilterPanelProps) {
  const facets = useFacets();
  return (
    <chakra.section mt={6} aria-label="Only these parts">
      <chakra.div display="flex" justifyContent="space-between" mb={1.5} fontSize="2xs" color="fg.muted">
        <chakra.h2 fontWeight="semibold">Only these parts</chakra.h2>
        <span>in the catalogue</span>
      </chakra.div>
      {facets.isPending && <Loading label="Reading what can be chosen" lines={3} />}
      {facets.isError && <Failed error={facets.error} onRetry={() => void facets.refetch()} />}
      {facets.data !== undefined && <Filters facets={facets.data} filters={filters} onChange={onChange} />}
      <chakra.div borderTop="1px solid" borderColor="border" py={1.5}>
        {flagNames.map((name) => (
          <chakra.label key={name} display="flex" gap={2} alignItems="center" minHeight={6} fontSize="sm">
            <chakra.input
              type="checkbox"
              accentColor="accent"
              checked={flags[name]}
              onChange={() =>
                onChange((before) => ({
                  ...before,
                  flags: { ...before.flags, [name]: !before.flags[name] },
                }))
              }
            />
            {flagWords[name]}
          </chakra.label>
        ))}
      </chakra.div>
    </chakra.section>
  );
});

interface FiltersProps {
  facets: Facets;
  filters: FindState['filters'];
  onChange: ChangeFind;
}

function Filters({ facets, filters, onChange }: FiltersProps) {
  const choices = filterChoices(facets, filters);
  return filterNames.map((name) => (
    <FilterGroup
      key={name}
      title={filterWords[name]}
      choices={choices[name]}
      chosen={filters[name]}
      onChosen={(chosen) =>
        onChange((before) => ({ ...before, filters: { ...before.filters, [name]: chosen } }))
      }
    />
  ));
}
