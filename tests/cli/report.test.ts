import { execFileSync } from 'node:child_process';
import { existsSync, mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import type { CalculationRecord } from '#shared/calc/record.ts';
import { editMarked, editPages, swapGlyphs } from './edit-pdf.ts';
import { runCommand, runScript } from './run-command.ts';

const folder = mkdtempSync(join(tmpdir(), 'report-'));
afterAll(() => rmSync(folder, { recursive: true }));
const out = (name: string): string => join(folder, name);

describe('report and verify', { timeout: 180_000 }, () => {
  const pdf = out('h1b.pdf');

  it('writes the PDF with its record, and all its lines are reproduced', async () => {
    const made = await runScript('report', [
      'tests/cli/h1b-lrfd.json',
      ...['--out', pdf, '--project', 'Tern Quay', '--number', 'C-104', '--title', 'Example'],
    ]);
    expect(made).toEqual({ code: 0, stdout: '', stderr: '' });
    execFileSync('qpdf', ['--check', pdf]);
    execFileSync('pdfdetach', ['-savefile', 'record.json', '-o', out('record.json'), pdf]);
    const calculated = await runCommand('calc', ['tests/cli/h1b-lrfd.json']);
    const [carried, record] = [readFileSync(out('record.json'), 'utf8'), calculated.stdout].map(
      (text) => JSON.parse(text) as CalculationRecord,
    );
    expect(carried).toEqual(record);
    expect(execFileSync('pdftotext', [pdf, '-']).toString()).toMatch(
      /C-104[\s\S]*Tern Quay|Tern Quay[\s\S]*C-104/,
    );
    const lines = record?.members.flatMap((m) => [
      ...m.lines,
      ...m.combinations.flatMap((c) => c.lines),
    ]);
    const count = lines?.filter((l) => l.kind !== 'section').length;
    const verified = await runScript('verify', [pdf]);
    expect(verified).toEqual({
      code: 0,
      stdout: `${count} of ${count} lines reproduced\narithmetic reproduced; this is not a design check\n`,
      stderr: '',
    });
  });

  it('names a number changed on a page, and ends with 1', async () => {
    const changed = out('changed.pdf');
    const edit = (content: string): string => {
      // The last result on the last page.
      const ids = [...content.matchAll(/\/MCID (\d+)/g)].map((m) => Number(m[1]));
      return editMarked(content, Math.max(...ids), (m) => swapGlyphs(m));
    };
    const pages = /^Pages:\s+(\d+)/m.exec(execFileSync('pdfinfo', [pdf]).toString())?.[1];
    writeFileSync(changed, await editPages(readFileSync(pdf), [{ page: Number(pages), edit }]));
    const { code, stdout } = await runScript('verify', [changed]);
    expect(code).toBe(1);
    expect(stdout).toMatch(/^(\d+) of \d+ lines reproduced\nNOT REPRODUCED: 1 problem\n/);
    expect(stdout).toMatch(/^member H\.1B, c1:H1\/y \(check\): page \d+ shows /m);
    expect(stdout).not.toMatch(/not a design check/);
  });

  it('verify ends with 2 where there is nothing to verify', async () => {
    const [text, none] = await Promise.all([
      runCommand('verify', ['package.json']),
      runCommand('verify', [out('none.pdf')]),
    ]);
    expect(text).toMatchObject({ code: 2, stdout: '' });
    expect(text.stderr).toMatch(/^package\.json: is not a PDF/);
    expect(none).toMatchObject({ code: 2, stdout: '' });
    expect(none.stderr).toMatch(/cannot be read \(ENOENT\)/);
  });

  it('report writes nothing for a wrong input, and no half file', async () => {
    const [wrong, nowhere, paper] = await Promise.all([
      runCommand('report', ['-', '--out', out('wrong.pdf')], '{}'),
      runCommand('report', ['tests/cli/h1b-asd.json', '--out', out('no/such/folder.pdf')]),
      runCommand('report', ['tests/cli/h1b-asd.json', '--out', out('a5.pdf'), '--paper', 'a5']),
    ]);
    expect(wrong).toMatchObject({ code: 2, stdout: '' });
    expect(wrong.stderr).toMatch(/^format: must be 1$/m);
    expect(existsSync(out('wrong.pdf'))).toBe(false);
    expect(nowhere).toMatchObject({ code: 2, stdout: '' });
    expect(paper.stderr).toMatch(/neither letter nor a4/);
    expect(readdirSync(folder).filter((name) => name.endsWith('.part'))).toEqual([]);
  });
});
