/** The columns of a sheet, points from its left; the result's width is its least one. */
export const sheetColumns = {
  reference: { x: 0, width: 61 },
  working: { x: 67 },
  /** Within the working column: what a given or looked-up value comes from. */
  source: { x: 238 },
  result: { least: 76, gap: 10 },
} as const;
