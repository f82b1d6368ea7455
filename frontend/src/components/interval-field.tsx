import { formatInterval } from '@resistry/engineering/notation/format-interval';
import { parseInterval } from '@resistry/engineering/notation/parse-interval';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import { useId } from 'react';
import { EntryInput, type EntryInputProps } from './entry-input';

/** What one number alone stands for: everything from zero to it, or it and nothing else. */
export type SingleMeaning = 'from-zero' | 'exact';

export interface IntervalFieldProps extends Omit<EntryInputProps, 'id' | 'echo'> {
  quantity: Quantity;
  single: SingleMeaning;
  id?: string;
}

/**
 * The ends that one number alone stands for; a negative voltage reaches from it up to zero.
 */
export function endsOfSingle(value: number, meaning: SingleMeaning): { min: number; max: number } {
  if (meaning === 'exact') return { min: value, max: value };
  return { min: Math.min(0, value), max: Math.max(0, value) };
}

function echoOf(
  typed: string,
  quantity: Quantity,
  meaning: SingleMeaning,
): { echo?: string; refusal?: string } {
  if (typed === '') return {};
  const parsed = parseInterval(typed, quantity);
  if (!parsed.ok) return { refusal: parsed.message };
  const ends = 'single' in parsed ? endsOfSingle(parsed.single, meaning) : parsed;
  const words = ends.min === ends.max ? parsed.text : formatInterval(ends.min, ends.max, quantity);
  return { echo: words === typed ? undefined : `${typed} → ${words}` };
}

/** An interval as engineers write it (0…24, −20 to 70, ±15 V); says what it understood. */
export function IntervalField({ quantity, single, error, id, ...entry }: IntervalFieldProps) {
  const ownId = useId();
  const { echo, refusal } = echoOf(entry.text.trim(), quantity, single);
  return <EntryInput {...entry} id={id ?? ownId} echo={echo} error={refusal ?? error} />;
}
