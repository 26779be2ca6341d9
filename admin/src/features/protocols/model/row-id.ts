/** The id of a point's row, to which a fault leads. */
export const rowId = (pointId: string): string => `point-${pointId}`;
