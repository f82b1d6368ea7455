import { chakra } from '@chakra-ui/react';
import { FoldedGroup } from '../panel/panel-group';
import type { FilterChoice } from './filter-choices';

const count = new Intl.NumberFormat('en');

const Choices = chakra('fieldset', {
  base: {
    maxHeight: '13rem',
    overflowY: 'auto',
    '& label': {
      display: 'grid',
      gridTemplateColumns: 'auto minmax(0, 1fr) auto',
      gap: 2,
      alignItems: 'center',
      minHeight: 6,
      fontSize: 'sm',
    },
    '& label > span': { overflow: 'hidden', textOverflow: 'ellipsis', whiteSpace: 'nowrap' },
    '& label > small': { color: 'fg.muted', fontSize: '2xs' },
    '& input': { accentColor: 'accent' },
  },
});

export interface FilterGroupProps {
  title: string;
  choices: readonly FilterChoice[];
  chosen: readonly string[];
  onChosen: (chosen: string[]) => void;
}

/** One filter, folded to what is chosen of it. */
export function FilterGroup({ title, choices, chosen, onChosen }: FilterGroupProps) {
  const summary = chosen.map((value) => choices.find((choice) => choice.value === value)?.words ?? value);
  const toggle = (value: string): void =>
    onChosen(chosen.includes(value) ? chosen.filter((each) => each !== value) : [...chosen, value]);
  return (
    <FoldedGroup title={title} summary={summary.join(', ') || 'any'}>
      <Choices>
        <chakra.legend srOnly>{title}</chakra.legend>
        {choices.map(({ value, words, parts }) => (
          <label key={value} title={words}>
            <input type="checkbox" checked={chosen.includes(value)} onChange={() => toggle(value)} />
            <span>{words}</span>
            <small>{count.format(parts)}</small>
          </label>
        ))}
      </Choices>
    </FoldedGroup>
  );
}
