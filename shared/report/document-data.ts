/** What a report says beside its record: who, when, for which project. Empty text is not stated. */
export interface DocumentData {
  readonly firm: string;
  readonly project: {
    readonly number: string;
    readonly title: string;
    readonly client: string;
    readonly place: string;
  };
  readonly calculation: {
    readonly number: string;
    readonly title: string;
    readonly revision: string;
    readonly status: string;
  };
  readonly people: {
    readonly originator: string;
    readonly checker: string | null;
    readonly approver: string | null;
  };
  /** As it is to be read: `14 May 2025`. */
  readonly date: string;
  readonly basis: BasisTexts;
  /** A calculation that is not issued is marked preliminary on every page. */
  readonly issued: boolean;
  readonly paper: 'A4' | 'Letter';
}

/** The basis of design in the originator's words; the rest of it is in the record. */
export interface BasisTexts {
  readonly buildingCode: {
    readonly name: string;
    readonly year: string;
    readonly amendments: string;
  };
  /** The edition of the standard that the building code adopts, such as `360-22`. */
  readonly adoptedEdition: string;
  readonly loadStandard: string;
  readonly analysis: {
    readonly swaySource: string;
    readonly notionalLoads: string;
    readonly program: string;
    readonly file: string;
  };
  readonly assumptions: string;
}

export const NOT_STATED = 'not stated';

export const stated = (words: string): string => (words.trim() === '' ? NOT_STATED : words.trim());

/** Data of a report made from an input file alone: nothing beside the record is known. */
export const unsignedDocument = (
  title: string,
  date: string,
  paper: DocumentData['paper'],
): DocumentData => ({
  firm: '',
  project: { number: '', title: '', client: '', place: '' },
  calculation: { number: '', title, revision: '', status: 'draft' },
  people: { originator: '', checker: null, approver: null },
  date,
  basis: {
    buildingCode: { name: '', year: '', amendments: '' },
    adoptedEdition: '',
    loadStandard: '',
    analysis: { swaySource: '', notionalLoads: '', program: '', file: '' },
    assumptions: '',
  },
  issued: false,
  paper,
});
