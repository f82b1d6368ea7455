import { chakra } from '@chakra-ui/react';
import { problemOf } from '../api/problem';

/** What the server said about a whole form. What belongs to one field is shown there instead. */
export function FormRefusal({ error }: { error: unknown }) {
  const problem = problemOf(error);
  return (
    <chakra.div role="alert" borderInlineStart="3px solid" borderColor="unmet" ps={3} py={1}>
      <chakra.p fontWeight="semibold">{problem.title}</chakra.p>
      {problem.detail !== undefined && problem.detail !== problem.title && (
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
