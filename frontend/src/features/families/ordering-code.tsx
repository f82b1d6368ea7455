import { chakra } from '@chakra-ui/react';
import { Figure } from '../../components/figure';
import { RuledTable } from '../../components/ruled-table';
import type { FamilyRevision } from './requests/family-revision';

/** How an order number is made up, with examples from the datasheet. */
export function OrderingCode({ revision }: { revision: FamilyRevision }) {
  return (
    <>
      <chakra.p mb={3}>
        Made up as <chakra.code overflowWrap="anywhere">{revision.orderingCodeTemplate}</chakra.code>
      </chakra.p>
      {revision.orderingCodeExamples.length > 0 && (
        <RuledTable label="Examples of ordering codes">
          <thead>
            <tr>
              <th scope="col">Example</th>
              <th scope="col">Size</th>
              <th scope="col">Resistance</th>
              <th scope="col">Tolerance</th>
              <th scope="col">TCR</th>
              <th scope="col">Packaging</th>
            </tr>
          </thead>
          <tbody>
            {revision.orderingCodeExamples.map((example) => (
              <tr key={example.code}>
                <th scope="row">{example.code}</th>
                <td>{example.size}</td>
                <td>
                  {example.resistance === 0 ? (
                    'link'
                  ) : (
                    <Figure value={example.resistance} quantity="resistance" />
                  )}
                </td>
                <td>
                  <Figure value={example.tolerance} quantity="tolerance" />
                </td>
                <td>
                  <Figure value={example.tcr} quantity="temperature-coefficient" />
                </td>
                <td>{example.packaging ?? <span className="not-stated">left open</span>}</td>
              </tr>
            ))}
          </tbody>
        </RuledTable>
      )}
    </>
  );
}
