/**
 * The first `count` of a list in an order, sorted, without sorting the rest: a quickselect narrows the list to them first.
 * The order must be total, so that pages are stable.
 */
export function selectFirst(
  items: readonly number[],
  count: number,
  compare: (first: number, second: number) => number,
): number[] {
  const list = items.slice();
  let low = 0;
  let high = list.length - 1;
  while (count < list.length && low < high) {
    const pivot = list[(low + high) >>> 1] ?? 0;
    let left = low;
    let right = high;
    while (left <= right) {
      while (compare(list[left] ?? 0, pivot) < 0) left += 1;
      while (compare(list[right] ?? 0, pivot) > 0) right -= 1;
      if (left <= right) {
        [list[left], list[right]] = [list[right] ?? 0, list[left] ?? 0];
        left += 1;
        right -= 1;
      }
    }
    if (count <= right) high = right;
    else if (count >= left) low = left;
    else break;
  }
  return list.slice(0, count).sort(compare);
}
