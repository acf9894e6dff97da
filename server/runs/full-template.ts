import { readFileSync } from 'node:fs';
import { parseTemplate } from '#shared/report/parse-template.ts';

const file = new URL('../../templates/full.md', import.meta.url);

/** The template that every report uses; it is part of the application and has no problems. */
export function fullTemplate() {
  const { template, problems } = parseTemplate(readFileSync(file, 'utf8'));
  const [first] = problems;
  if (first) throw new Error(`templates/full.md:${first.line}:${first.column} ${first.message}`);
  return template;
}
