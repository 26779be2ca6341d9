/** A JSON column as it comes from the database: the driver may have read it already. */
export function fromJson(column: unknown): unknown {
  return typeof column === 'string' ? JSON.parse(column) : column;
}
