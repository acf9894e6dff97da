const segment = encodeURIComponent;

/** Every address inside the application, so that none is spelled twice. */
export const paths = {
  desk: '/',
  signIn: '/sign-in',
  account: '/account',
  gallery: '/gallery',
  library: '/library',
  /** A clause of a book, or one of its formulas by the formula's id. */
  clause: (book: string, clause: string, formula?: string) =>
    `/library/${segment(book)}/${segment(clause)}${formula ? `#${segment(formula)}` : ''}`,
  project: (projectId: string) => `/projects/${segment(projectId)}`,
  calculation: (calculationId: string) => `/calculations/${segment(calculationId)}`,
  basis: (calculationId: string) => `/calculations/${segment(calculationId)}/basis`,
  report: (calculationId: string) => `/calculations/${segment(calculationId)}/report`,
  member: (calculationId: string, memberId: string, place?: SheetPlace) =>
    `/calculations/${segment(calculationId)}/members/${segment(memberId)}${placeQuery(place)}`,
} as const;

/** A place on a member's sheet that a link can point at. */
export interface SheetPlace {
  readonly combination?: string | undefined;
  readonly line?: string | undefined;
}

function placeQuery(place: SheetPlace | undefined): string {
  const query = new URLSearchParams();
  if (place?.combination) query.set('combination', place.combination);
  if (place?.line) query.set('line', place.line);
  return query.size > 0 ? `?${query}` : '';
}
