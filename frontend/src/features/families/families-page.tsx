import { chakra } from '@chakra-ui/react';
import { Answered } from '../../components/answered';
import { Button } from '../../components/button';
import { Page } from '../../components/page';
import { Empty } from '../../components/states';
import { useDebounced } from '../search/use-debounced';
import { FamilyFilters } from './family-filters';
import { FamilyTable } from './family-table';
import { useFamilies } from './requests/list-families';
import { useFamilyFilter } from './use-family-filter';

const settleMilliseconds = 200;

/** Every family of the catalogue, narrowed by words, technology and manufacturer. */
export function Component() {
  const [filter, change] = useFamilyFilter();
  const text = useDebounced(filter.text, settleMilliseconds);
  const families = useFamilies({ ...filter, text });
  return (
    <Page title="Families" lead="What the manufacturers’ datasheets state, revision by revision.">
      <FamilyFilters filter={filter} onChange={change} />
      <Answered query={families} label="Reading the families">
        {(items) =>
          items.length === 0 ? (
            <>
              <Empty title="No family is like that">Take a word away, or look at all of them.</Empty>
              <Button onClick={() => change({ text: '', technology: '', manufacturer: '' })}>
                Show all families
              </Button>
            </>
          ) : (
            <>
              <chakra.p role="status" fontSize="sm" color="fg.muted" mb={1}>
                {items.length === 1 ? '1 family' : `${items.length} families`}
              </chakra.p>
              <FamilyTable families={items} />
            </>
          )
        }
      </Answered>
    </Page>
  );
}
