import { chakra } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { RuledTable } from '../../components/ruled-table';
import { Section } from '../../components/section';
import { Empty } from '../../components/states';
import { type PolicySummary, usePolicies } from './requests/list-policies';

function Versions({ label, policies }: { label: string; policies: readonly PolicySummary[] }) {
  if (policies.length === 0) return <Empty title="None is published" />;
  return (
    <RuledTable label={label}>
      <thead>
        <tr>
          <th scope="col">Policy</th>
          <th scope="col">Stands</th>
          <th scope="col">Note</th>
          <th scope="col">Source</th>
        </tr>
      </thead>
      <tbody>
        {policies.map((policy) => (
          <tr key={policy.id}>
            <chakra.th scope="row" whiteSpace={{ md: 'nowrap' }}>
              <Link to={`/policies/${policy.id}`}>
                {policy.name} {policy.version}
              </Link>
            </chakra.th>
            <chakra.td whiteSpace="nowrap">
              {policy.inForce ? <chakra.b color="met">in force</chakra.b> : 'to be named in a duty'}
            </chakra.td>
            <chakra.td minWidth="12rem">{policy.note}</chakra.td>
            <chakra.td minWidth="14rem" color="fg.muted">
              {policy.source}
            </chakra.td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}

/** Published versions: the company's own, and the tables of agencies. */
export function Component() {
  const policies = usePolicies();
  return (
    <Page title="Policies" lead="How much of a rating may be used. Published versions never change.">
      <Answered query={policies} label="Reading the policies">
        {(items) => (
          <>
            <Section title="Of the company">
              <Versions
                label="Of the company"
                policies={items.filter(({ origin }) => origin === 'company')}
              />
            </Section>
            <Section title="Of agencies" lead="As printed in the source named.">
              <Versions label="Of agencies" policies={items.filter(({ origin }) => origin === 'agency')} />
            </Section>
          </>
        )}
      </Answered>
    </Page>
  );
}
