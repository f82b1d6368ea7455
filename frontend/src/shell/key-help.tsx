import { Dialog, Portal, chakra } from '@chakra-ui/react';
import { Button } from '../components/button';
import { switchSingleKeys, useSingleKeysOn } from '../components/single-key';

interface Keys {
  keys: readonly string[];
  does: string;
}

const groups: readonly { title: string; lines: readonly Keys[] }[] = [
  {
    title: 'Anywhere',
    lines: [
      { keys: ['/'], does: 'Search by part number, family or manufacturer' },
      { keys: ['?'], does: 'Show these keys' },
      { keys: ['Esc'], does: 'Close what lies on top' },
    ],
  },
  {
    title: 'Find',
    lines: [
      { keys: ['d'], does: 'To the duty' },
      { keys: ['p'], does: 'To the parts' },
      { keys: ['Enter'], does: 'In an entry of the duty: to the parts' },
      { keys: ['Enter', 'Esc'], does: 'In a number of the sentence: keep it, or bring the old one back' },
    ],
  },
  {
    title: 'In the table of parts',
    lines: [
      { keys: ['↑', '↓', '←', '→'], does: 'To the next cell; j and k go down and up as well' },
      { keys: ['Page up', 'Page down'], does: 'A screen up or down' },
      { keys: ['Home', 'End'], does: 'To the ends of the row; with Ctrl, of the table' },
      { keys: ['Enter'], does: 'Open the assessment beside the list' },
      { keys: ['Space'], does: 'Show the sources under a company number, or hide them' },
      { keys: ['Ctrl', 'C'], does: 'Copy the row' },
    ],
  },
];

const Lines = chakra('dl', {
  base: {
    display: 'grid',
    gridTemplateColumns: { base: '6rem minmax(0, 1fr)', sm: '9.5rem minmax(0, 1fr)' },
    columnGap: 4,
    rowGap: 1.5,
    mb: 4,
    fontSize: 'sm',
    '& dt': { display: 'flex', flexWrap: 'wrap', gap: 1 },
    '& dd': { m: 0 },
    '& kbd': {
      font: 'inherit',
      fontSize: 'xs',
      lineHeight: 'tight',
      border: '1px solid',
      borderColor: 'border.field',
      borderRadius: 'sm',
      bg: 'bg.field',
      px: 1.5,
      py: 0.5,
      alignSelf: 'start',
    },
  },
});

/** What the keyboard does, and the switch for those keys that work without a modifier. */
export default function KeyHelp({ onClose }: { onClose: () => void }) {
  const singleKeysOn = useSingleKeysOn();
  return (
    <Dialog.Root open onOpenChange={({ open }) => !open && onClose()}>
      <Portal>
        <Dialog.Backdrop />
        <Dialog.Positioner>
          <Dialog.Content>
            <Dialog.Title>Keys</Dialog.Title>
            <Dialog.Body>
              {groups.map(({ title, lines }) => (
                <section key={title} aria-label={title}>
                  <chakra.h3 fontSize="xs" color="fg.muted" mb={1.5}>
                    {title}
                  </chakra.h3>
                  <Lines>
                    {lines.map(({ keys, does }) => (
                      <div key={does} style={{ display: 'contents' }}>
                        <dt>
                          {keys.map((key) => (
                            <kbd key={key}>{key}</kbd>
                          ))}
                        </dt>
                        <dd>{does}</dd>
                      </div>
                    ))}
                  </Lines>
                </section>
              ))}
              <chakra.label display="flex" gap={2} alignItems="center" fontSize="sm" minHeight={6}>
                <chakra.input
                  type="checkbox"
                  accentColor="accent"
                  checked={singleKeysOn}
                  onChange={(event) => switchSingleKeys(event.target.checked)}
                />
                Single keys (/ ? d p) work outside of fields
              </chakra.label>
            </Dialog.Body>
            <Dialog.Footer>
              <Button onClick={onClose}>Close</Button>
            </Dialog.Footer>
          </Dialog.Content>
        </Dialog.Positioner>
      </Portal>
    </Dialog.Root>
  );
}
