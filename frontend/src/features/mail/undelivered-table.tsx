import { chakra } from '@chakra-ui/react';
import { Button } from '../../components/button';
import { FormRefusal } from '../../components/form-refusal';
import { RuledTable } from '../../components/ruled-table';
import { momentWords } from '../../wording/date-words';
import { type UndeliveredMessage, useRetryMessage } from './requests/undelivered';

/** Messages that did not arrive, with the reason. */
export function UndeliveredTable({ messages }: { messages: readonly UndeliveredMessage[] }) {
  const retry = useRetryMessage();
  if (messages.length === 0) return <p className="not-stated">Everything has been delivered.</p>;
  return (
    <>
      {retry.isError && <FormRefusal error={retry.error} />}
      <RuledTable label="Undelivered messages">
        <thead>
          <tr>
            <th scope="col">Message</th>
            <th scope="col">Since</th>
            <th scope="col" data-number>
              Attempts
            </th>
            <th scope="col">Next attempt</th>
            <th scope="col">What went wrong</th>
            <th scope="col">
              <chakra.span srOnly>Try again</chakra.span>
            </th>
          </tr>
        </thead>
        <tbody>
          {messages.map((message) => (
            <tr key={message.id}>
              <th scope="row">{message.kind}</th>
              <td>{momentWords(message.createdAt)}</td>
              <td data-number>{message.attempts}</td>
              <td>
                {message.state === 'dead' ? (
                  <chakra.b color="unmet">given up</chakra.b>
                ) : (
                  momentWords(message.nextAttemptAt)
                )}
              </td>
              <chakra.td overflowWrap="anywhere" minWidth="12rem">
                {message.lastError}
              </chakra.td>
              <td data-number>
                {message.state === 'dead' && (
                  <Button
                    variant="plain"
                    aria-label={`Try ${message.kind} of ${momentWords(message.createdAt)} again`}
                    disabled={retry.isPending && retry.variables === message.id}
                    onClick={() => retry.mutate(message.id)}
                  >
                    Try again
                  </Button>
                )}
              </td>
            </tr>
          ))}
        </tbody>
      </RuledTable>
    </>
  );
}
