import type { Transaction } from 'sequelize';

/** What every loader needs: the site to read, and the transaction to read in. */
export type Within = { readonly where: { readonly siteId: string }; readonly transaction: Transaction };

/** Rows by the key they hang on; a key without rows gives none. */
export const groupRows = <Row>(rows: readonly Row[], keyOf: (row: Row) => string): ((key: string) => readonly Row[]) => {
  const groups = new Map<string, Row[]>();
  for (const row of rows) {
    const group = groups.get(keyOf(row));
    if (group === undefined) groups.set(keyOf(row), [row]);
    else group.push(row);
  }
  return (key) => groups.get(key) ?? [];
};
