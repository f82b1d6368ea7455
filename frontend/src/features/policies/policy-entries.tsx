import { chakra } from '@chakra-ui/react';
import type { PolicyEntry } from '@resistry/engineering/derating/policy-entry';
import { Figure } from '../../components/figure';
import { RuledTable } from '../../components/ruled-table';
import { policyMatchWords } from './policy-match-words';

const readingWords = {
  parallel: 'a line of its own beneath the manufacturer’s',
  multiplied: 'the manufacturer’s curve times the share',
} as const;

/** Absent in the policy: it sets no such limit, which is no value of one. */
const unset = <span className="not-stated">not stated</span>;

function Line({ entry }: { entry: PolicyEntry }) {
  if (entry.reading === 'multiplied') return <>{readingWords.multiplied}</>;
  return (
    <>
      {readingWords.parallel}: full up to{' '}
      {entry.from === undefined ? 'its knee' : <Figure value={entry.from} quantity="temperature" />}, nothing
      at{' '}
      {entry.zero === undefined ? (
        'the temperature where the share puts it'
      ) : (
        <Figure value={entry.zero} quantity="temperature" />
      )}
    </>
  );
}

/** The entries in their order: the first that matches a part is in force for it. */
export function PolicyEntries({ entries }: { entries: readonly PolicyEntry[] }) {
  return (
    <RuledTable label="Entries">
      <thead>
        <tr>
          <th scope="col">For</th>
          <th scope="col">Dissipation</th>
          <th scope="col">Over temperature</th>
          <th scope="col">Voltage</th>
          <th scope="col">Pulses</th>
          <th scope="col">Never above</th>
          <th scope="col">Kept below the element’s highest</th>
          <th scope="col">At altitude</th>
        </tr>
      </thead>
      <tbody>
        {entries.map((entry, place) => (
          <tr key={`${place} ${policyMatchWords(entry.match)}`}>
            <chakra.th scope="row" minWidth={{ md: '9rem' }}>
              {policyMatchWords(entry.match)}
            </chakra.th>
            <td>
              <Figure value={entry.powerRatio} quantity="fraction" />
            </td>
            <chakra.td minWidth="13rem">
              <Line entry={entry} />
            </chakra.td>
            <td>
              <Figure value={entry.voltageRatio} quantity="fraction" />
            </td>
            <td>
              {entry.pulseRatio === undefined ? (
                unset
              ) : (
                <Figure value={entry.pulseRatio} quantity="fraction" />
              )}
            </td>
            <td>
              {entry.maxTemperature === undefined ? (
                unset
              ) : (
                <Figure value={entry.maxTemperature} quantity="temperature" />
              )}
            </td>
            <td>
              {entry.reserve === undefined ? (
                unset
              ) : (
                <Figure value={entry.reserve} quantity="temperature-difference" />
              )}
            </td>
            <td>
              {entry.altitude === undefined
                ? unset
                : entry.altitude.map(([metre, factor]) => (
                    <chakra.div key={metre} whiteSpace="nowrap">
                      <Figure value={metre} quantity="altitude" />:{' '}
                      <Figure value={factor} quantity="fraction" />
                    </chakra.div>
                  ))}
            </td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}
