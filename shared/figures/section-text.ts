/** A designation as it is read: the table's `W12X79` is W12×79. */
export const sectionText = (designation: string): string =>
  designation.replace(/(?<=[\d.])X(?=[\d.])/g, '×');
