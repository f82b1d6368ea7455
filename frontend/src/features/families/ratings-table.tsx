import { chakra } from '@chakra-ui/react';
import { Fragment } from 'react';
import { RuledTable } from '../../components/ruled-table';
import { Cited } from './cited';
import { ratingGroups } from './rating-rows';
import type { FamilyRevision, FamilySize, SizeRatings } from './requests/family-revision';
import { sizeWords } from './size-words';

interface RatedColumn {
  key: string;
  size: FamilySize;
  mode: string;
  ratings: SizeRatings;
}

const columnsOf = (sizes: readonly FamilySize[]): RatedColumn[] =>
  sizes.flatMap((size) =>
    size.modes.map(({ name, ratings }) => ({ key: `${size.size.id} ${name}`, size, mode: name, ratings })),
  );

const GroupTitle = chakra('th', {
  base: { color: 'fg.muted', fontSize: 'xs', paddingTop: '1.25rem !important' },
});

const NotStated = chakra('td', {
  base: {
    backgroundImage: 'repeating-linear-gradient(135deg, {colors.border} 0 1px, transparent 1px 7px)',
  },
});

/** Ratings as lines, sizes and their operating modes as columns. What the datasheet does not state says so. */
export function RatingsTable({ revision }: { revision: FamilyRevision }) {
  const columns = columnsOf(revision.sizes);
  return (
    <RuledTable label="Ratings by size">
      <thead>
        <tr>
          <th scope="col">Rating</th>
          {columns.map(({ key, size, mode }) => (
            <th key={key} scope="col">
              <chakra.span color="fg">{sizeWords(size.size)}</chakra.span>
              <chakra.span display="block" fontWeight="normal">
                {mode}
              </chakra.span>
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {ratingGroups.map(({ title, rows }) => (
          <Fragment key={title}>
            <tr>
              <GroupTitle scope="colgroup" colSpan={columns.length + 1}>
                {title}
              </GroupTitle>
            </tr>
            {rows.map(({ label, field, show }) => (
              <tr key={label}>
                <chakra.th scope="row" minWidth={{ md: '12rem' }}>
                  <Cited
                    label={label}
                    citations={revision.citations.filter((citation) => citation.field === field)}
                  />
                </chakra.th>
                {columns.map(({ key, size, ratings }) => {
                  const value = show(ratings, size);
                  return value === undefined ? (
                    <NotStated key={key}>
                      <span className="not-stated">not stated</span>
                    </NotStated>
                  ) : (
                    <chakra.td key={key} minWidth="7.5rem">
                      {value}
                    </chakra.td>
                  );
                })}
              </tr>
            ))}
          </Fragment>
        ))}
      </tbody>
    </RuledTable>
  );
}
