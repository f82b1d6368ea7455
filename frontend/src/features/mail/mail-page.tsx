import { useState } from 'react';
import { Link } from 'react-router-dom';
import type { Schema } from '../../api/schema';
import { Answered } from '../../components/answered';
import { Page } from '../../components/page';
import { PageTurner } from '../../components/page-turner';
import { RuledTable } from '../../components/ruled-table';
import { Section } from '../../components/section';
import { Empty } from '../../components/states';
import { momentWords } from '../../wording/date-words';
import { lettersPerPage, useMailList } from './requests/read-mail';
import { useUndelivered } from './requests/undelivered';
import { UndeliveredTable } from './undelivered-table';

function Letters({ letters }: { letters: readonly Schema<'MailSummary'>[] }) {
  return (
    <RuledTable label="Letters">
      <thead>
        <tr>
          <th scope="col">Subject</th>
          <th scope="col">To</th>
          <th scope="col">When</th>
        </tr>
      </thead>
      <tbody>
        {letters.map((letter) => (
          <tr key={letter.id}>
            <th scope="row">
              <Link to={`/mail/${encodeURIComponent(letter.id)}`}>{letter.subject || 'No subject'}</Link>
            </th>
            <td>{letter.to}</td>
            <td>{letter.date === '' ? 'not stated' : momentWords(letter.date)}</td>
          </tr>
        ))}
      </tbody>
    </RuledTable>
  );
}

/** What this machine sent where no mail server is configured, and what could not be sent. */
export function Component() {
  const [page, setPage] = useState(1);
  const mail = useMailList((page - 1) * lettersPerPage);
  const undelivered = useUndelivered();
  return (
    <Page title="Mail box" lead="Letters that this machine has kept instead of sending.">
      <Answered query={mail} label="Reading the letters">
        {({ kept, total, items }) =>
          items.length === 0 ? (
            <Empty title={kept ? 'No letter yet' : 'Letters go out by a mail server'}>
              {kept ? 'Invitations and links to new passwords arrive here.' : 'So none of them is kept here.'}
            </Empty>
          ) : (
            <>
              <Letters letters={items} />
              <PageTurner page={page} pageSize={lettersPerPage} total={total} onPage={setPage} />
            </>
          )
        }
      </Answered>
      <Section
        title="Undelivered"
        lead="Tried again by itself for a while, then given up until somebody asks."
      >
        <Answered query={undelivered} label="Reading what is undelivered" lines={2}>
          {(messages) => <UndeliveredTable messages={messages} />}
        </Answered>
      </Section>
    </Page>
  );
}
