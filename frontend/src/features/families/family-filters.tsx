import { chakra } from '@chakra-ui/react';
import { technologies } from '@resistry/engineering/ratings/technology';
import { useId } from 'react';
import { FieldRow } from '../../components/field-row';
import { SelectField } from '../../components/select-field';
import { TextInput } from '../../components/text-input';
import { technologyWords } from '../../wording/technology-words';
import type { FamilyFilter } from './requests/list-families';
import { useManufacturers } from './requests/list-manufacturers';

export interface FamilyFiltersProps {
  filter: FamilyFilter;
  onChange: (change: Partial<FamilyFilter>) => void;
}

const Row = chakra('div', {
  base: {
    display: 'grid',
    gap: 4,
    gridTemplateColumns: { base: '1fr', md: 'minmax(0, 2fr) minmax(0, 1fr) minmax(0, 1fr)' },
    mb: 4,
  },
});

/** Words, technology and manufacturer. */
export function FamilyFilters({ filter, onChange }: FamilyFiltersProps) {
  const textId = useId();
  const manufacturers = useManufacturers();
  return (
    <Row role="search" aria-label="Narrow the families">
      <FieldRow label="Code, name or manufacturer" controlId={textId} stacked>
        <TextInput
          id={textId}
          type="search"
          size="form"
          value={filter.text}
          onChange={(event) => onChange({ text: event.target.value })}
        />
      </FieldRow>
      <SelectField
        label="Technology"
        stacked
        value={filter.technology}
        options={[
          { value: '', words: 'any' },
          ...technologies.map((technology) => ({ value: technology, words: technologyWords[technology] })),
        ]}
        onValue={(technology) => onChange({ technology })}
      />
      <SelectField
        label="Manufacturer"
        stacked
        value={filter.manufacturer}
        options={[
          { value: '', words: 'any' },
          ...(manufacturers.data ?? []).map(({ id, name }) => ({ value: String(id), words: name })),
        ]}
        onValue={(manufacturer) => onChange({ manufacturer })}
      />
    </Row>
  );
}
