/** Which columns a person chose, remembered in the browser by table. Storage may be closed to us; then nothing is kept. */
const keyOf = (tableId: string): string => `resistry-columns-${tableId}`;

export function rememberedColumns(tableId: string): Record<string, boolean> {
  try {
    const stored: unknown = JSON.parse(window.localStorage.getItem(keyOf(tableId)) ?? '{}');
    if (typeof stored !== 'object' || stored === null) return {};
    return Object.fromEntries(
      Object.entries(stored).filter((entry): entry is [string, boolean] => typeof entry[1] === 'boolean'),
    );
  } catch {
    return {};
  }
}

export function rememberColumns(tableId: string, visible: Record<string, boolean>): void {
  try {
    window.localStorage.setItem(keyOf(tableId), JSON.stringify(visible));
  } catch {
    // Nothing is lost but the memory of it.
  }
}
