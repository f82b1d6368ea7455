import { chakra } from '@chakra-ui/react';
import { Answered } from '../../components/answered';
import { Button } from '../../components/button';
import { DoneNotice } from '../../components/done-notice';
import { FormRefusal } from '../../components/form-refusal';
import { Page } from '../../components/page';
import { RuledTable } from '../../components/ruled-table';
import { Empty } from '../../components/states';
import { BackupRow } from './backup-row';
import { useBackups, useTakeBackup } from './requests/backups';

/** The backups of this machine: what there is, whether it is whole, how to put it back. */
export function Component() {
  const backups = useBackups();
  const take = useTakeBackup();
  return (
    <Page
      title="Backups"
      lead="The whole database and its files. To put one back, stop the server and enter its command where the program lies."
      actions={
        <Button variant="solid" disabled={take.isPending || backups.isError} onClick={() => take.mutate()}>
          {take.isPending ? 'Taking a backup' : 'Take a backup now'}
        </Button>
      }
    >
      {take.isError && <FormRefusal error={take.error} />}
      {take.isSuccess && <DoneNotice>The backup {take.data.name} is taken.</DoneNotice>}
      <Answered query={backups} label="Reading the backups">
        {(items) =>
          items.length === 0 ? (
            <Empty title="No backup yet">One is taken every night; take the first one now.</Empty>
          ) : (
            <chakra.div mt={3}>
              <RuledTable label="Backups">
                <thead>
                  <tr>
                    <th scope="col">Taken</th>
                    <th scope="col" data-number>
                      Size
                    </th>
                    <th scope="col">Whole?</th>
                    <th scope="col">To put it back</th>
                  </tr>
                </thead>
                <tbody>
                  {items.map((backup) => (
                    <BackupRow key={backup.name} backup={backup} />
                  ))}
                </tbody>
              </RuledTable>
            </chakra.div>
          )
        }
      </Answered>
    </Page>
  );
}
