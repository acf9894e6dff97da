/** The three columns of a sheet, points from its left; the result's width is its least one. */
export const sheetColumns = {
  reference: { x: 0, width: 56 },
  working: { x: 62 },
  result: { least: 76, gap: 10 },
} as const;
