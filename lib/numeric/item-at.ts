/**
 * The item at a place of a list, counted from the end if negative, where the caller knows that there
 * is one.
 *
 * @throws RangeError if there is none.
 * @example itemAt(['oak', 'ash'], -1) // → 'ash'
 */
export function itemAt<T>(list: readonly T[], place: number): T {
  const item = list.at(place);
  if (item === undefined) {
    throw new RangeError(`itemAt: place is ${place}; expected one of ${list.length} items`);
  }
  return item;
}
