import { chakra } from '@chakra-ui/react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { Answered } from '../../components/answered';
import { LinkButton } from '../../components/button';
import { Page } from '../../components/page';
import { Section } from '../../components/section';
import { Empty } from '../../components/states';
import { NotFoundPage } from '../../shell/not-found-page';
import { approvalCountWords } from './approval-count-words';
import { FamilyPapers } from './family-papers';
import { findFamilyLink } from './find-link';
import { type FamilyDetails, useFamily } from './requests/get-family';
import { useFamilyRevision } from './requests/get-family-revision';
import { RevisionSections } from './revision-sections';
import { RevisionTable } from './revision-table';

const Notice = chakra('p', {
  base: { borderInlineStart: '3px solid', borderColor: 'caution', ps: 3, mb: 5, fontSize: 'sm' },
});

function OtherRevision({ family, number }: { family: FamilyDetails; number: number }) {
  const revision = useFamilyRevision(family.id, number);
  return (
    <Answered query={revision} label={`Reading revision ${number}`}>
      {(read) => (
        <>
          {read.state === 'published' && family.revision !== undefined && (
            <Notice>
              <b>Not in force any more.</b> Parts are rated by{' '}
              <Link to={`/families/${family.id}`}>revision {family.revision.number}</Link>.
            </Notice>
          )}
          <RevisionSections revision={read} technology={family.technology} />
        </>
      )}
    </Answered>
  );
}

function Family({ family }: { family: FamilyDetails }) {
  const asked = Number(useSearchParams()[0].get('revision'));
  const shown = Number.isInteger(asked) && asked > 0 ? asked : family.revision?.number;
  const { code, name, manufacturer } = family;
  return (
    <Page
      title={code}
      lead={`${name}, ${manufacturer.name}: ${approvalCountWords(family.approvals)}.`}
      actions={
        <LinkButton to={findFamilyLink(family.id)} color="fg" textDecoration="none">
          Find its parts
        </LinkButton>
      }
    >
      {shown === undefined ? (
        <Empty title="No revision is published yet">Its drafts stand below.</Empty>
      ) : shown === family.revision?.number ? (
        <RevisionSections revision={family.revision} technology={family.technology} />
      ) : (
        <OtherRevision family={family} number={shown} />
      )}
      <Section title="Papers">
        <FamilyPapers {...family} />
      </Section>
      <Section title="Revisions" lead={`Entered first by ${family.enteredBy.name}.`}>
        <RevisionTable revisions={family.revisions} shown={shown} />
      </Section>
    </Page>
  );
}

function KnownFamily({ id }: { id: number }) {
  const family = useFamily(id);
  // Read again and failed, what was read before stays.
  if (family.data !== undefined) return <Family family={family.data} />;
  return (
    <Page title="Family">
      <Answered query={family} label="Reading the family" lines={12}>
        {() => null}
      </Answered>
    </Page>
  );
}

/** One family with everything its datasheets state. */
export function Component() {
  const id = Number(useParams().id);
  return Number.isInteger(id) && id > 0 ? <KnownFamily id={id} /> : <NotFoundPage />;
}
