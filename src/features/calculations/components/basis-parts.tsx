import { SelectField, TextArea, TextField } from '#client/ui/text-field.tsx';
import type { BasisDraft } from '#shared/contracts/calculations.ts';
import { parseQuantity } from '#shared/units/parse.ts';
import {
  constantWords,
  designWords,
  methodWords,
  provisionWords,
  secondOrderWords,
  swayWords,
  unitWords,
} from '../basis-words.ts';
import type { HeadAndBasis } from '../mutations.ts';

interface PartProps {
  value: HeadAndBasis;
  edit: (value: HeadAndBasis, field: string) => void;
}

const setters = ({ value, edit }: PartProps) => ({
  basis: (change: Partial<BasisDraft>, field: string) =>
    edit({ ...value, basis: { ...value.basis, ...change } }, field),
  analysis: (change: Partial<BasisDraft['analysis']>, field: string) =>
    edit(
      { ...value, basis: { ...value.basis, analysis: { ...value.basis.analysis, ...change } } },
      field,
    ),
  code: (change: Partial<BasisDraft['buildingCode']>, field: string) =>
    edit(
      {
        ...value,
        basis: { ...value.basis, buildingCode: { ...value.basis.buildingCode, ...change } },
      },
      field,
    ),
});

export function HeadPart({ value, edit }: PartProps) {
  return (
    <>
      <TextField
        label="Number"
        maxLength={40}
        value={value.number}
        problem={value.number.trim() ? undefined : 'A calculation has a number'}
        onChange={(event) => edit({ ...value, number: event.target.value }, 'number')}
      />
      <TextField
        label="Title"
        maxLength={160}
        value={value.title}
        problem={value.title.trim() ? undefined : 'A calculation has a title'}
        onChange={(event) => edit({ ...value, title: event.target.value }, 'title')}
      />
    </>
  );
}

export function BookPart(props: PartProps) {
  const { basis } = props.value;
  const set = setters(props);
  return (
    <>
      <TextField label="Standard" value="ANSI/AISC 360-22" readOnly />
      <SelectField
        label="Design"
        value={basis.design}
        options={designWords}
        onValue={(design) => set.basis({ design }, 'design')}
      />
      <SelectField
        label="Units of the sheets"
        value={basis.units}
        options={unitWords}
        hint="Input may be in either, such as 14 ft or 4.27 m."
        onValue={(units) => set.basis({ units }, 'units')}
      />
      <SelectField
        label="Material constants"
        value={basis.constants}
        options={constantWords}
        onValue={(constants) => set.basis({ constants }, 'constants')}
      />
    </>
  );
}

const memberEffect = [
  { value: 'unsaid', text: 'not said yet' },
  { value: 'yes', text: 'in the analysis (members subdivided or with stability functions)' },
  { value: 'no', text: 'not in the analysis' },
] as const;

export function AnalysisPart(props: PartProps) {
  const { analysis } = props.value.basis;
  const set = setters(props);
  const effect = analysis.includesMemberEffect;
  return (
    <>
      <SelectField
        label="Method"
        value={analysis.method}
        options={methodWords}
        onValue={(method) => set.analysis({ method }, 'method')}
      />
      <SelectField
        label="Second-order moments"
        value={analysis.secondOrder}
        options={secondOrderWords}
        onValue={(secondOrder) => set.analysis({ secondOrder }, 'secondOrder')}
      />
      {analysis.secondOrder === 'from-analysis' && (
        <SelectField
          label="The member’s own second-order effect (P-δ)"
          fieldClassName="col-span-2"
          value={effect === null ? 'unsaid' : effect ? 'yes' : 'no'}
          options={memberEffect}
          problem={effect === null ? 'The sheet cannot be made before this is said' : undefined}
          onValue={(word) =>
            set.analysis(
              { includesMemberEffect: word === 'unsaid' ? null : word === 'yes' },
              'effect',
            )
          }
        />
      )}
      <SelectField
        label="Do the stories sway?"
        value={analysis.sway}
        options={swayWords}
        problem={
          analysis.sway === 'B2' && analysis.secondOrder !== 'amplified'
            ? 'B2 belongs to first-order moments: choose amplified by B1'
            : undefined
        }
        hint={
          analysis.sway === 'none'
            ? 'The ends of the members do not move sideways relative to each other.'
            : 'Each combination then gives what goes with the sway, and its story.'
        }
        onValue={(sway) => set.analysis({ sway }, 'sway')}
      />
      <TextField
        label="Known from"
        optional
        maxLength={400}
        value={analysis.swaySource}
        onChange={(event) => set.analysis({ swaySource: event.target.value }, 'swaySource')}
      />
      <TextField
        label="Second-order over first-order drift"
        optional
        maxLength={60}
        inputMode="decimal"
        placeholder="Δ2nd / Δ1st"
        value={analysis.driftRatio ?? ''}
        problem={driftProblem(analysis.driftRatio ?? '')}
        onChange={(event) => set.analysis({ driftRatio: event.target.value }, 'driftRatio')}
      />
      <TextField
        label="Drift known from"
        optional
        maxLength={400}
        value={analysis.driftSource ?? ''}
        onChange={(event) => set.analysis({ driftSource: event.target.value }, 'driftSource')}
      />
      <TextField
        label="Notional loads"
        optional
        maxLength={400}
        fieldClassName="col-span-2"
        value={analysis.notionalLoads}
        onChange={(event) => set.analysis({ notionalLoads: event.target.value }, 'notionalLoads')}
      />
      <TextField
        label="Analysis made with"
        optional
        maxLength={120}
        value={analysis.program}
        onChange={(event) => set.analysis({ program: event.target.value }, 'program')}
      />
      <TextField
        label="File of the forces"
        optional
        maxLength={200}
        value={analysis.file}
        onChange={(event) => set.analysis({ file: event.target.value }, 'file')}
      />
    </>
  );
}

/** A ratio of drifts is a number of at least 1. */
function driftProblem(text: string): string | undefined {
  if (text.trim() === '') return undefined;
  const parsed = parseQuantity(text, 'none');
  if (!parsed.ok) return `It ${parsed.reason}`;
  return parsed.quantity.value < 1
    ? 'Second-order drift is not below first-order drift'
    : undefined;
}

/** What the standard leaves to the engineer, for all members of the calculation. */
export function ProvisionsPart(props: PartProps) {
  const { analysis } = props.value.basis;
  const chosen = analysis.provisions ?? [];
  const set = setters(props);
  return (
    <ul className="col-span-2 grid gap-2.5">
      {provisionWords.map(({ value, text, about }) => (
        <li key={value}>
          <label className="flex items-baseline gap-2.5">
            <input
              type="checkbox"
              checked={chosen.includes(value)}
              onChange={() =>
                set.analysis(
                  {
                    provisions: chosen.includes(value)
                      ? chosen.filter((other) => other !== value)
                      : [...chosen, value],
                  },
                  `provision/${value}`,
                )
              }
              className="translate-y-0.5 accent-oxide"
            />
            <span>
              {text}
              <span className="block text-small text-zinc-7">{about}</span>
            </span>
          </label>
        </li>
      ))}
    </ul>
  );
}

export function CodePart(props: PartProps) {
  const { basis } = props.value;
  const set = setters(props);
  const adopted = basis.adoptedEdition.trim();
  return (
    <>
      <TextField
        label="Building code"
        optional
        maxLength={120}
        value={basis.buildingCode.name}
        onChange={(event) => set.code({ name: event.target.value }, 'codeName')}
      />
      <TextField
        label="Year of the code"
        optional
        maxLength={20}
        value={basis.buildingCode.year}
        onChange={(event) => set.code({ year: event.target.value }, 'codeYear')}
      />
      <TextField
        label="Edition of the steel standard it adopts"
        optional
        maxLength={40}
        value={basis.adoptedEdition}
        hint={
          adopted && adopted !== '360-22'
            ? `This calculation is to 360-22 and not to ${adopted}; the cover says so.`
            : 'Such as 360-22.'
        }
        onChange={(event) => set.basis({ adoptedEdition: event.target.value }, 'adopted')}
      />
      <TextField
        label="Load standard"
        optional
        maxLength={120}
        value={basis.loadStandard}
        onChange={(event) => set.basis({ loadStandard: event.target.value }, 'loads')}
      />
      <TextField
        label="Local amendments"
        optional
        maxLength={400}
        fieldClassName="col-span-2"
        value={basis.buildingCode.amendments}
        onChange={(event) => set.code({ amendments: event.target.value }, 'amendments')}
      />
      <TextArea
        label="Assumptions"
        optional
        maxLength={4000}
        fieldClassName="col-span-2"
        value={basis.assumptions}
        onChange={(event) => set.basis({ assumptions: event.target.value }, 'assumptions')}
      />
    </>
  );
}
