/** The form of a sheet before there are inputs to set it from. */
export function BlankSheet(props: {
  mark: string;
  titleFields: readonly { label: string; value: string }[];
}) {
  return (
    <section
      aria-label="Sheet, still blank"
      data-screen-only
      className="@container/sheet mx-auto max-w-[880px] bg-paper pb-24 shadow-sheet"
    >
      <div className="sheet-head">
        <div>
          <span className="field-label">Member sheet</span>
          <span className="field-value">{props.mark || 'without a mark'}</span>
        </div>
        {props.titleFields.map(({ label, value }) => (
          <div key={label}>
            <span className="field-label">{label}</span>
            <span className="field-value">{value}</span>
          </div>
        ))}
      </div>
      <p className="max-w-[52ch] px-6 pt-6 font-serif text-zinc-7">
        The sheet is set here as soon as section, lengths, restraints and the forces of one
        combination are given: each line with its clause, its formula, the values put in and its
        result.
      </p>
    </section>
  );
}
