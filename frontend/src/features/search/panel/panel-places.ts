import type { EntryName } from '../duty/duty-entry';

/** Ids of the controls in the duty panel, so that the sentence and the ledger can lead to them. */
export const panelPlaces = {
  pulses: 'duty-pulses',
  policy: 'duty-policy',
  deviation: 'duty-deviation',
  mounting: 'duty-mounting',
  features: 'duty-features',
  safety: 'duty-safety',
  secondSource: 'duty-second-source',
  approval: 'duty-approval',
  supply: 'duty-supply',
} as const;

export type PanelPlace = (typeof panelPlaces)[keyof typeof panelPlaces] | `duty-entry-${EntryName}`;

export const entryPlace = (name: EntryName): `duty-entry-${EntryName}` => `duty-entry-${name}`;

/** Unfolds the group that holds a control and puts the keyboard there. */
export function goToPlace(place: PanelPlace): void {
  const control = document.getElementById(place);
  for (let fold = control?.closest('details'); fold; fold = fold.parentElement?.closest('details'))
    fold.open = true;
  const target = control?.matches('input, select, button')
    ? control
    : control?.querySelector<HTMLElement>('input, select, button');
  target?.focus();
  target?.scrollIntoView({ block: 'center' });
}
