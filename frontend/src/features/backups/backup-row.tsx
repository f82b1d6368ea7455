import { chakra } from '@chakra-ui/react';
import { problemOf } from '../../api/problem';
import { Button } from '../../components/button';
import { momentWords } from '../../wording/date-words';
import { type ListedBackup, useCheckBackup } from './requests/backups';

const reasonWords = { nightly: 'nightly', 'on-demand': 'on demand' } as const;
const megabyte = 1e6;

const megabytes = (bytes: number): string =>
  (bytes / megabyte).toLocaleString('en', { maximumFractionDigits: 1 });

function CheckResult({ check }: { check: ReturnType<typeof useCheckBackup> }) {
  if (check.isPending) return <span role="status">Reading it through</span>;
  if (check.isError) {
    return (
      <chakra.span role="alert" color="unmet">
        {problemOf(check.error).title}
      </chakra.span>
    );
  }
  if (check.data === undefined) return <span className="not-stated">not checked now</span>;
  if (check.data.sound)
    return (
      <chakra.b role="status" color="met">
        sound, can be restored
      </chakra.b>
    );
  return (
    <chakra.div role="alert" color="unmet">
      <b>cannot be restored</b>
      <ul>
        {check.data.faults.map((fault) => (
          <li key={fault}>{fault}</li>
        ))}
      </ul>
    </chakra.div>
  );
}

/** One backup, with how to check it and how to put it back. */
export function BackupRow({ backup: { name, details } }: { backup: ListedBackup }) {
  const check = useCheckBackup();
  return (
    <tr>
      <chakra.th scope="row" whiteSpace={{ md: 'nowrap' }}>
        {details === undefined ? name : momentWords(details.createdAt)}
        <chakra.span display="block" fontWeight="normal" color="fg.muted">
          {details === undefined ? 'damaged: it cannot say what it holds' : reasonWords[details.reason]}
        </chakra.span>
      </chakra.th>
      <td data-number>
        {details === undefined ? (
          <span className="not-stated">unknown</span>
        ) : (
          <span className="figure">
            {megabytes(details.bytes)}
            <span className="unit"> MB</span>
          </span>
        )}
      </td>
      <td>
        <CheckResult check={check} />
        <chakra.div>
          <Button
            variant="plain"
            aria-label={`Check ${name}`}
            disabled={check.isPending}
            onClick={() => check.mutate(name)}
          >
            Check it
          </Button>
        </chakra.div>
      </td>
      <chakra.td minWidth="16rem">
        <chakra.code fontSize="xs" overflowWrap="anywhere">
          npm run restore -w backend -- {name}
        </chakra.code>
      </chakra.td>
    </tr>
  );
}
