import { Formula as FormulaMark } from '#client/document/formula.tsx';
import type { ClauseConstant, ClauseDecision, ClauseFacts } from '#shared/library/clause-facts.ts';

/** What a clause's lookups gave in the published cases: `φc = 0.90`. */
export function ClauseConstants({ facts }: { facts: readonly ClauseFacts[] }) {
  const constants = facts.flatMap(({ constant }) => constant ?? []);
  if (constants.length === 0) return null;
  return (
    <>
      <h2 className="caps mt-6 mb-1">Constants</h2>
      <ul>
        {constants.map((constant) => (
          <Constant key={JSON.stringify(constant)} constant={constant} />
        ))}
      </ul>
    </>
  );
}

function Constant({
  constant: { tex, text, published, title, from },
}: {
  constant: ClauseConstant;
}) {
  return (
    <li className="flex items-baseline gap-2 border-b border-zinc-2 py-1.5">
      <span className="figures whitespace-nowrap">
        <FormulaMark tex={`${tex}=`} />
        <span className="sr-only">{text} is</span> <strong>{published}</strong>
      </span>
      <span className="ml-auto text-right font-condensed text-small text-zinc-7">
        {title}; {from}
      </span>
    </li>
  );
}

/** Which way a clause goes, as the procedure asks: each condition with what follows from it. */
export function ClauseDecisions({ facts }: { facts: readonly ClauseFacts[] }) {
  const decisions = facts.flatMap(({ decision }) => decision ?? []);
  return decisions.map((decision) => (
    <Decision key={JSON.stringify(decision)} decision={decision} />
  ));
}

function Decision({ decision: { title, ways, otherwise } }: { decision: ClauseDecision }) {
  return (
    <div className="sheet-line" data-kind="choice">
      <div className="line-reference">
        <span className="text-zinc-7">decision</span>
      </div>
      <p className="line-title">{title}</p>
      <div className="line-words">
        {ways.map(({ condition, outcome }, index) => (
          <span key={condition}>
            {index === 0 ? 'If ' : 'Else if '}
            <strong className="figures whitespace-nowrap">{condition}</strong>, {outcome}.{' '}
          </span>
        ))}
        {otherwise && `Otherwise ${otherwise}.`}
      </div>
    </div>
  );
}
