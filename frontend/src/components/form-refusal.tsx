import { chakra } from '@chakra-ui/react';
import { problemOf } from '../api/problem';

export interface FormRefusalProps {
  error: unknown;
  /** What to call it where nobody is signed in because that is what the form is for. */
  unauthenticated?: string;
}

/** What the server said about a whole form. What belongs to one field is shown there instead. */
export function FormRefusal({ error, unauthenticated }: FormRefusalProps) {
  const problem = problemOf(error);
  const title = problem.status === 401 ? (unauthenticated ?? problem.title) : problem.title;
  return (
    <chakra.div role="alert" borderInlineStart="3px solid" borderColor="unmet" ps={3} py={1}>
      <chakra.p fontWeight="semibold">{title}</chakra.p>
      {problem.detail !== undefined && problem.detail !== title && (
        <chakra.p color="fg.muted" fontSize="sm">
          {problem.detail}
        </chakra.p>
      )}
      {problem.rule !== undefined && (
        <chakra.p color="fg.muted" fontSize="sm">
          The rule: {problem.rule}
        </chakra.p>
      )}
    </chakra.div>
  );
}
