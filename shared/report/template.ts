import { z } from 'zod';
import type { Block } from './tree.ts';

/** The blocks a template may call for, with the attributes each of them takes. */
export const DIRECTIVES = {
  cover: z.strictObject({}),
  basis: z.strictObject({}),
  results: z.strictObject({}),
  unconfirmed: z.strictObject({}),
  completeness: z.strictObject({}),
  members: z.strictObject({}),
  cautions: z.strictObject({}),
} as const;

export type DirectiveName = keyof typeof DIRECTIVES;

export const isDirective = (name: string): name is DirectiveName => Object.hasOwn(DIRECTIVES, name);

export type TemplatePart =
  | { readonly kind: 'prose'; readonly block: Block }
  | { readonly kind: 'directive'; readonly name: DirectiveName };

export interface Template {
  readonly name: string;
  readonly parts: readonly TemplatePart[];
}

export const TEMPLATE_RULES = [
  'unknown-directive',
  'directive-form',
  'directive-attribute',
  'front-matter',
  'not-supported',
  'no-members',
  'no-cautions',
  'repeated-directive',
] as const;

/** What is wrong in a template, and where: lines and columns start at 1. */
export interface TemplateProblem {
  readonly line: number;
  readonly column: number;
  readonly rule: (typeof TEMPLATE_RULES)[number];
  readonly message: string;
}
