import { parseQuantity } from '@resistry/engineering/notation/parse-quantity';
import type { Quantity } from '@resistry/engineering/notation/quantity';
import { useId } from 'react';
import { EntryInput, type EntryInputProps } from './entry-input';

export interface QuantityFieldProps extends Omit<EntryInputProps, 'id' | 'echo'> {
  quantity: Quantity;
  id?: string;
}

/** One quantity in any notation of the trade; says what it understood ("4k7 → 4.7 kΩ") or what to write instead. */
export function QuantityField({ quantity, error, id, ...entry }: QuantityFieldProps) {
  const ownId = useId();
  const typed = entry.text.trim();
  const parsed = typed === '' ? undefined : parseQuantity(typed, quantity);
  const echo = parsed?.ok === true && parsed.text !== typed ? `${typed} → ${parsed.text}` : undefined;
  const refusal = parsed?.ok === false ? parsed.message : undefined;
  return <EntryInput {...entry} id={id ?? ownId} echo={echo} error={refusal ?? error} />;
}
