import { Link, useParams } from 'react-router-dom';
import { Answered } from '../../components/answered';
import { Facts } from '../../components/facts';
import { Page } from '../../components/page';
import { Section } from '../../components/section';
import { NotFoundPage } from '../../shell/not-found-page';
import { PolicyEntries } from './policy-entries';
import { usePolicy } from './requests/get-policy';

function KnownPolicy({ id }: { id: number }) {
  const policy = usePolicy(id);
  return (
    <Page
      title={policy.data === undefined ? 'Policy' : `${policy.data.name} ${policy.data.version}`}
      actions={<Link to="/policies">All policies</Link>}
    >
      <Answered query={policy} label="Reading the policy">
        {({ source, note, inForce, origin, entries }) => (
          <>
            <Facts
              facts={[
                ['Stands', inForce ? 'in force' : 'not in force; a duty may name it'],
                ['Origin', origin === 'company' ? 'the company’s own' : 'an agency’s table'],
                ['Source', source],
                ['Note', note],
              ]}
            />
            <Section title="Entries" lead="The first that matches a part is in force for it.">
              <PolicyEntries entries={entries} />
            </Section>
          </>
        )}
      </Answered>
    </Page>
  );
}

/** One published version, entry by entry. */
export function Component() {
  const id = Number(useParams().id);
  return Number.isInteger(id) && id > 0 ? <KnownPolicy id={id} /> : <NotFoundPage />;
}
