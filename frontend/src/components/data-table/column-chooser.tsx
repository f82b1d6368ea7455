import { chakra } from '@chakra-ui/react';
import { Button } from '../button';
import { FloatingPanel } from '../floating-panel';
import { useDisclosure } from '../use-disclosure';

export interface ColumnChooserProps {
  choices: readonly { id: string; header: string; shown: boolean; toggle: () => void }[];
}

/** Which columns are shown; remembered in this browser. */
export function ColumnChooser({ choices }: ColumnChooserProps) {
  const { open, rootRef, buttonProps, panelId } = useDisclosure();
  return (
    <chakra.div ref={rootRef} position="relative">
      <Button variant="plain" {...buttonProps}>
        Columns
      </Button>
      {open && (
        <FloatingPanel id={panelId} px={3}>
          <chakra.fieldset>
            <chakra.legend srOnly>Columns shown</chakra.legend>
            {choices.map((choice) => (
              <chakra.label key={choice.id} display="flex" gap={2} alignItems="center" py={1} fontSize="sm">
                <chakra.input
                  type="checkbox"
                  checked={choice.shown}
                  onChange={choice.toggle}
                  accentColor="accent"
                />
                {choice.header}
              </chakra.label>
            ))}
          </chakra.fieldset>
        </FloatingPanel>
      )}
    </chakra.div>
  );
}
