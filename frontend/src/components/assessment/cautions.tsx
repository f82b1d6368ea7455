import { chakra } from '@chakra-ui/react';
import type { Caution } from '@resistry/engineering/cautions/cautions';

/** What the numbers warn of, and what every result owes its reader. */
export function Cautions({ cautions, notice }: { cautions: readonly Caution[]; notice: string }) {
  return (
    <chakra.aside
      aria-label="Cautions"
      borderInlineStart="3px solid"
      borderColor="caution"
      ps={3}
      fontSize="xs"
      lineHeight={1.5}
    >
      {cautions.map((caution) => (
        <chakra.p key={caution.kind} mb={1.5}>
          <chakra.b color="caution">{caution.title}</chakra.b> {caution.text}
        </chakra.p>
      ))}
      <chakra.p color="fg.muted">{notice}</chakra.p>
    </chakra.aside>
  );
}
