import { describe, expect, test } from 'vitest';
import { zoneViolations } from './check-zones.ts';
import { findCycles } from './find-cycles.ts';
import { readSource } from './read-imports.ts';
import { resolveImport } from './resolve-import.ts';
import { readSources } from './sources.ts';
import { zones } from './zones.ts';

const sources = readSources(Object.keys(zones));

describe('the repository', () => {
  test('is read', () => {
    for (const zone of Object.keys(zones)) {
      expect(sources.filter(({ path }) => path.startsWith(`${zone}/`))).not.toHaveLength(0);
    }
  });

  test('imports only along the zones', () => {
    expect(sources.flatMap(zoneViolations)).toEqual([]);
  });

  test('has no import cycle', () => {
    const graph = new Map(
      sources.map((source) => {
        const targets = readSource(source).imports.map((name) => resolveImport(source.path, name));
        return [source.path, targets.flatMap((to) => (to.kind === 'file' ? [to.path] : []))];
      }),
    );
    // Were the paths resolved wrongly, the graph would fall apart and hold no cycle at all.
    const inside = [...graph.values()].flat().filter((path) => /\.tsx?$/.test(path));
    expect(inside.filter((path) => !graph.has(path) && !path.startsWith('tests/'))).toEqual([]);
    expect(findCycles(graph)).toEqual([]);
  });
});

describe('the checker', () => {
  test.each([
    ['shared/units/a.ts', "import { b } from '#shared/calc/b.ts';"],
    ['shared/units/a.ts', "import type { B } from '#shared/calc/b.ts';"],
    ['shared/units/a.ts', "export * from '../calc/b.ts';"],
    ['shared/units/a.ts', "export { b } from '#shared/calc/b.ts';"],
    ['shared/units/a.ts', "type B = import('#shared/calc/b.ts').B;"],
    ['shared/units/a.ts', "const b = await import('#shared/calc/b.ts');"],
    ['shared/units/a.ts', 'const b = await import(name);'],
    ['shared/units/a.ts', "import { b } from '#shared/other/b.ts';"],
    ['shared/units/a.test.ts', "import { b } from '#shared/calc/b.ts';"],
    ['shared/other/a.ts', 'export const a = 1;'],
    ['shared/a.ts', 'export const a = 1;'],
    ['shared/calc/a.ts', "import { b } from '#server/b.ts';"],
    ['shared/calc/a.ts', "import { b } from '#client/lib/b.ts';"],
    ['shared/calc/a.ts', "import { b } from '#tests/support/b.ts';"],
    ['shared/calc/a.ts', "import { readFileSync } from 'node:fs';"],
    ['shared/calc/a.ts', "import { readFileSync } from 'fs';"],
    ['shared/calc/a.ts', "import { useState } from 'react';"],
    ['shared/calc/a.ts', "import pg from 'pg';"],
    ['shared/calc/a.ts', "import { eq } from 'drizzle-orm/pg-core';"],
    ['shared/calc/a.ts', 'export const a = () => Date.now();'],
    ['shared/calc/a.ts', 'export const a = () => new Date();'],
    ['shared/calc/a.ts', 'export const a = () => Math.random();'],
    ['shared/standards/aisc360-22/E3.ts', "import { b } from '#shared/members/b.ts';"],
    ['shared/standards/aisc360-22/E3.ts', "import { b } from '../elastic-theory/b.ts';"],
    ['shared/standards/aisc360-22/E3.ts', "import { b } from '#shared/sections/b.ts';"],
    ['shared/contracts/a.ts', "import { b } from '#server/features/b.ts';"],
    ['server/app.ts', "import { b } from '#client/lib/b.ts';"],
    ['server/app.ts', "import { b } from '../src/lib/b.ts';"],
    ['server/app.ts', "import { useState } from 'react';"],
    ['server/app.ts', "import { b } from '#tests/support/b.ts';"],
    ['src/lib/a.ts', "import { b } from '#server/env.ts';"],
    ['src/lib/a.ts', "import { join } from 'node:path';"],
    ['src/lib/a.ts', "import express from 'express';"],
    ['src/lib/a.tsx', "import { b } from '#client/features/members/b.ts';"],
    ['src/features/members/a.tsx', "import { b } from '#client/features/actions/b.tsx';"],
    ['src/features/members/a.tsx', "import { b } from '../actions/b.tsx';"],
  ])('reports %s: %s', (path, text) => {
    expect(zoneViolations({ path, text })).toHaveLength(1);
  });

  test.each([
    ['shared/calc/a.ts', "import { b } from '#shared/units/b.ts';"],
    ['shared/calc/a.ts', "import { b } from './b.ts'; // not Date.now()"],
    ['shared/calc/a.ts', "import { all } from 'mathjs/number';"],
    ['shared/calc/a.ts', 'export const a = (text: string) => new Date(text);'],
    ['shared/calc/a.test.ts', "import { readFileSync } from 'node:fs';"],
    ['shared/calc/a.test.ts', "import { b } from '#tests/reference/b.ts';"],
    ['shared/members/a.ts', "import { b } from '#shared/standards/elastic-theory/b.ts';"],
    ['shared/standards/aisc360-22/E3.ts', "import { b } from '../book.ts';"],
    ['server/app.ts', "import { join } from 'node:path'; import '#shared/policy/b.ts';"],
    ['src/routes/a.tsx', "import { b } from '#client/features/members/b.ts';"],
    ['src/features/members/a.tsx', "import { b } from './b.tsx'; const c = <b />;"],
    ['src/lib/a.ts', "import { b } from '#shared/policy/b.ts'; import './a.css';"],
  ])('lets %s have: %s', (path, text) => {
    expect(zoneViolations({ path, text })).toEqual([]);
  });

  test('reports what it cannot parse', () => {
    expect(() => zoneViolations({ path: 'src/a.ts', text: 'import {' })).toThrow('src/a.ts');
  });

  test('finds a cycle, however long, and none in a diamond', () => {
    const cycle = { a: ['b'], b: ['c'], c: ['d', 'a'], d: [] };
    const diamond = { a: ['b', 'c'], b: ['d'], c: ['d'], d: [] };
    expect(findCycles(new Map(Object.entries(cycle)))).toEqual([['a', 'b', 'c', 'a']]);
    expect(findCycles(new Map(Object.entries({ a: ['a'] })))).toEqual([['a', 'a']]);
    expect(findCycles(new Map(Object.entries(diamond)))).toEqual([]);
  });
});
