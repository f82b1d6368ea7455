import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { type Problem, problemOf } from '../api/problem';
import { Button } from './button';

const Notice = chakra('div', {
  base: {
    borderInlineStart: '3px solid',
    borderColor: 'border.field',
    ps: 4,
    py: 1,
    maxWidth: 'prose',
    my: 4,
  },
});

const Words = chakra('p', { base: { color: 'fg.muted', mt: 1 } });

/** Nothing is there, said with what to do about it. */
export function Empty({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <Notice>
      <chakra.h2 fontSize="md">{title}</chakra.h2>
      {children !== undefined && <Words>{children}</Words>}
    </Notice>
  );
}

/** Bars where the lines will be. Screen readers hear what is being waited for. */
export function Loading({ label, lines = 6 }: { label: string; lines?: number }) {
  return (
    <chakra.div role="status" aria-busy="true" py={4}>
      <chakra.span srOnly>{label}</chakra.span>
      {Array.from({ length: lines }, (_, line) => (
        <chakra.div
          key={line}
          aria-hidden="true"
          height={3}
          my={4}
          bg="border"
          borderRadius="sm"
          animation="breathe 1.6s ease-in-out infinite"
          style={{ width: `${92 - ((line * 37) % 41)}%` }}
        />
      ))}
    </chakra.div>
  );
}

/** What may be another answer the next time: no answer, a fault of the server's own, too many at once. */
const mayPass = ({ status }: Problem): boolean => status === 0 || status === 429 || status >= 500;

/** A request that failed, in the server's own words, with what to quote and, where that may help, a way to try again. */
export function Failed({ error, onRetry }: { error: unknown; onRetry?: () => void }) {
  const problem = problemOf(error);
  if (problem.status === 403) return <Forbidden problem={problem} />;
  const fields = problem.fields.filter(({ message }) => problem.detail?.includes(message) !== true);
  return (
    <Notice role="alert" borderColor="unmet">
      <chakra.h2 fontSize="md">{problem.title}</chakra.h2>
      {problem.detail !== undefined && problem.detail !== problem.title && <Words>{problem.detail}</Words>}
      {fields.length > 0 && (
        <chakra.ul mt={2}>
          {fields.map((field) => (
            <chakra.li key={`${field.pointer} ${field.message}`} fontSize="sm">
              <chakra.span color="fg.muted">{field.pointer}</chakra.span> {field.message}
            </chakra.li>
          ))}
        </chakra.ul>
      )}
      {problem.status >= 500 && problem.requestId !== undefined && (
        <Words fontSize="xs">Should you need help with it, quote request {problem.requestId}.</Words>
      )}
      {onRetry !== undefined && mayPass(problem) && (
        <Button mt={3} onClick={onRetry}>
          Try again
        </Button>
      )}
    </Notice>
  );
}

/** Stands above what was read earlier when reading it again has failed: it stays, with whatever is being typed in it. */
export function NotReadAgain({ error, onRetry }: { error: unknown; onRetry: () => void }) {
  return (
    <Notice role="status" borderColor="caution">
      <Words mt={0}>
        This could not be read again just now, so it may be older than what the server holds.{' '}
        {problemOf(error).title}.
      </Words>
      <Button mt={2} onClick={onRetry}>
        Read it again
      </Button>
    </Notice>
  );
}

/** Not allowed, with the rule that says so and whom to ask. */
export function Forbidden({ problem }: { problem?: Problem }) {
  return (
    <Notice role="alert" borderColor="caution">
      <chakra.h2 fontSize="md">This is kept for other roles</chakra.h2>
      <Words>{problem?.detail ?? 'Your roles do not include what this page needs.'}</Words>
      {problem?.rule !== undefined && <Words>The rule: {problem.rule}</Words>}
      <Words>An administrator can show who may do what, and give you a role.</Words>
    </Notice>
  );
}
