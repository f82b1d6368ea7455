import { featureWords, technologyWords } from '../../wording/technology-words';
import { chakra } from '@chakra-ui/react';
import type { Technology } from '@resistry/engineering/ratings/technology';
import { standardReferenceTemperature } from '@resistry/engineering/ratings/ratings';
import type { ReactNode } from 'react';
import { Facts } from '../../components/facts';
import { Figure } from '../../components/figure';
import { Section } from '../../components/section';
import { DeratingCharts } from './derating-charts';
import { OrderingCode } from './ordering-code';
import { PackagingTable } from './packaging-table';
import { RangeTable } from './range-table';
import { RatingsTable } from './ratings-table';
import type { FamilyRevision } from './requests/family-revision';

const notStated: ReactNode = <span className="not-stated">not stated</span>;

/** What one revision of a family states. */
export function RevisionSections(props: { revision: FamilyRevision; technology: Technology }) {
  const { revision, technology } = props;
  return (
    <>
      <Section title={`Revision ${revision.number}`} lead={revision.description}>
        <Facts
          facts={[
            ['Technology', technologyWords[technology]],
            [
              'Features',
              revision.features.map((feature) => featureWords[feature]).join(', ') || 'none stated',
            ],
            [
              'Temperature the TCR refers to',
              <>
                <Figure
                  value={revision.referenceTemperature ?? standardReferenceTemperature}
                  quantity="temperature"
                />
                {revision.referenceTemperature === undefined && (
                  <span className="not-stated"> by IEC 60115-1, the datasheet states none</span>
                )}
              </>,
            ],
            ['Style in the failure-rate handbook', revision.failureRateStyle ?? notStated],
            [
              'Datasheet',
              revision.datasheet === undefined
                ? notStated
                : `${revision.datasheet.documentNumber} rev. ${revision.datasheet.revision}`,
            ],
          ]}
        />
      </Section>
      <Section title="Ratings" lead="Open a line’s name to see where in the datasheet it stands.">
        <RatingsTable revision={revision} />
      </Section>
      <Section title="Derating">
        <DeratingCharts sizes={revision.sizes} />
      </Section>
      <Section title="Resistances">
        <RangeTable revision={revision} />
      </Section>
      <Section title="Ordering code">
        <OrderingCode revision={revision} />
        <chakra.div mt={4}>
          <PackagingTable packagings={revision.packagings} />
        </chakra.div>
      </Section>
    </>
  );
}
