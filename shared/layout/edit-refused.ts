/** An edit whose place in the layout is gone. The message is for the person whose edit could not be kept. */
export class EditRefused extends Error {
  override readonly name = 'EditRefused';
}

/** The item with this id; throws EditRefused when another edit took it away. */
export function find<T extends { id: string }>(items: readonly T[], id: string, noun: string): T {
  const item = items.find((i) => i.id === id);
  if (!item) throw new EditRefused(`The ${noun} this belongs to is gone.`);
  return item;
}

/** Whether two corner names mean the same corner. */
export function sameCorner(a: readonly [string, string], b: readonly [string, string]): boolean {
  return a[0] === b[0] && a[1] === b[1];
}
