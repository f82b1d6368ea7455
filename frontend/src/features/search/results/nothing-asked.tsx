import { chakra } from '@chakra-ui/react';
import { Empty } from '../../../components/states';
import { entryDefinitions, entryNames } from '../duty/duty-entry';
import type { ReadDuty } from '../duty/read-duty';
import { type PanelPlace, entryPlace, goToPlace, panelPlaces } from '../panel/panel-places';
import { PhraseButton } from '../sentence/phrase';

export interface NothingAskedProps {
  read: ReadDuty;
  /** Called before leading to a control of the panel, which may be folded away. */
  onGoTo: () => void;
}

/** Nothing can be searched, because entries cannot be read: each of them, with its message and the way to it. */
export function NothingAsked({ read, onGoTo }: NothingAskedProps) {
  const unreadable = entryNames.flatMap((name): { place: PanelPlace; label: string; message: string }[] => {
    const message = read.errors[name];
    return message === undefined
      ? []
      : [{ place: entryPlace(name), label: entryDefinitions[name].label, message }];
  });
  const pulses = read.pulseErrors.flatMap((errors) => Object.values(errors));
  if (pulses[0] !== undefined)
    unreadable.push({ place: panelPlaces.pulses, label: 'Pulses', message: pulses[0] });
  return (
    <Empty title="Nothing is searched yet">
      {unreadable.map(({ place, label, message }) => (
        <chakra.span key={place} display="block">
          <PhraseButton
            type="button"
            onClick={() => {
              onGoTo();
              requestAnimationFrame(() => goToPlace(place));
            }}
          >
            {label}
          </PhraseButton>
          : {message}
        </chakra.span>
      ))}
    </Empty>
  );
}
