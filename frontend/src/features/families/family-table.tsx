import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { RuledTable } from '../../components/ruled-table';
import { dayWords } from '../../wording/date-words';
import { technologyWords } from '../../wording/technology-words';
import { approvalCountWords } from './approval-count-words';
import type { FamilySummary } from './requests/list-families';

/** Families with what there is of each. */
export function FamilyTable({ families }: { families: readonly FamilySummary[] }) {
  return (
    <RuledTable label="Families">
      <thead>
        <tr>
          <th scope="col">Family</th>
          <th scope="col">Manufacturer</th>
          <th scope="col">Technology</th>
          <th scope="col">Revision</th>
          <th scope="col" data-number>
            Sizes
          </th>
          <th scope="col" data-number>
            Parts
          </th>
          <th scope="col">By approval</th>
        </tr>
      </thead>
      <tbody>
        {families.map((family) => (
          <tr key={family.id}>
            <chakra.th scope="row" minWidth={{ md: '10rem' }}>
              <Link to={`/families/${family.id}`}>{family.code}</Link>
              <chakra.span display="block" fontWeight="normal" color="fg.muted">
                {family.name}
              </chakra.span>
            </chakra.th>
            <td>{family.manufacturer.name}</td>
            <td>{technologyWords[family.technology]}</td>
            <chakra.td whiteSpace="nowrap">
              {family.revision === undefined ? (
                <chakra.span color="fg.muted">not published</chakra.span>
              ) : (
                <>
                  {family.revision.number}{' '}
                  <span className="not-stated">of {dayWords(family.revision.publishedAt)}</span>
                </>
              )}
            </chakra.td>
            <td data-number>{family.sizes}</td>
            <td data-number>{family.parts.toLocaleString('en')}</td>
            <chakra.td minWidth="12rem" color="fg.muted">
              {approvalCountWords(family.approvals)}
            </chakra.td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}
