import { chakra } from '@chakra-ui/react';

export interface ChoiceGroupProps<Value extends string> {
  id?: string;
  /** What is chosen from; shown above the choices. */
  legend: string;
  choices: readonly Value[];
  words: Record<Value, string>;
  chosen: readonly Value[];
  onChosen: (chosen: Value[]) => void;
}

/** Several of a short list. */
export function ChoiceGroup<Value extends string>(props: ChoiceGroupProps<Value>) {
  const { id, legend, choices, words, chosen, onChosen } = props;
  const toggle = (value: Value): void => {
    onChosen(
      choices.filter((choice) => (choice === value ? !chosen.includes(choice) : chosen.includes(choice))),
    );
  };
  return (
    <chakra.fieldset id={id} py={1}>
      <chakra.legend fontSize="xs" color="fg.muted" p={0} mb={0.5}>
        {legend}
      </chakra.legend>
      {choices.map((choice) => (
        <chakra.label
          key={choice}
          display="flex"
          gap={2}
          alignItems="center"
          py={0.5}
          minHeight={6}
          fontSize="sm"
        >
          <chakra.input
            type="checkbox"
            checked={chosen.includes(choice)}
            onChange={() => toggle(choice)}
            accentColor="accent"
          />
          {words[choice]}
        </chakra.label>
      ))}
    </chakra.fieldset>
  );
}
