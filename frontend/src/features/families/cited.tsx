import { chakra } from '@chakra-ui/react';
import type { Citation } from './requests/family-revision';
import { sizeWords } from './size-words';

export interface CitedProps {
  label: string;
  citations: readonly Citation[];
}

/** A name that opens where in the datasheet its figures stand. */
export function Cited({ label, citations }: CitedProps) {
  if (citations.length === 0) return <>{label}</>;
  return (
    <details>
      <chakra.summary cursor="pointer">{label}</chakra.summary>
      <chakra.ul fontWeight="normal" fontSize="xs" color="fg.muted">
        {citations.map(({ datasheet, page, size, note }) => (
          <li key={`${datasheet.id} ${page} ${size?.id ?? ''} ${note ?? ''}`}>
            {size !== undefined && `${sizeWords(size)}: `}
            {datasheet.documentNumber} rev. {datasheet.revision}, page {page}
            {note !== undefined && `; ${note}`}
          </li>
        ))}
      </chakra.ul>
    </details>
  );
}
