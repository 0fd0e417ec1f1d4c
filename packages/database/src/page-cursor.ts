/** A page of a list with the cursor of the next one; null on the last. */
export interface Page<Item> {
  readonly items: Item[];
  readonly next: string | null;
}

/** Cuts one row more than a page down to the page, and makes the cursor of its last row. */
export function pageFrom<Row, Item>(rows: readonly Row[], limit: number, itemOf: (row: Row) => Item, keyOf: (row: Row) => readonly (string | number)[]): Page<Item> {
  const last = rows.length > limit ? rows[limit - 1] : undefined;
  const next = last === undefined ? null : Buffer.from(JSON.stringify(keyOf(last))).toString('base64url');
  return { items: rows.slice(0, limit).map(itemOf), next };
}

/** The key in a cursor; null where it is not one of ours. */
export function readCursor(cursor: string | undefined, parts: number): string[] | null {
  if (cursor === undefined) return null;
  try {
    const key: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
    return Array.isArray(key) && key.length === parts && key.every((part) => typeof part === 'string') ? key : null;
  } catch {
    return null;
  }
}
