import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import canonicalize from 'canonicalize';
import type { Line } from './line.ts';
import type { CalculationRecord } from './record.ts';

/** RFC 8785 canonical JSON of plain data; throws where a number isn't finite. */
export function canonicalText(value: unknown): string {
  const text = canonicalize(value);
  if (text === undefined) throw new Error('nothing to write as JSON');
  return text;
}

/** SHA-256 of a text's UTF-8 bytes, in hex. */
export const sha256Hex = (text: string): string => bytesToHex(sha256(utf8ToBytes(text)));

/** A line without provenance, labels and printed digits: what it computes. */
function resultOf(line: Line): unknown {
  switch (line.kind) {
    case 'given':
      return { key: line.key, symbol: line.symbol, value: line.value, dimension: line.dimension };
    case 'statement':
      return { key: line.key, statement: line.statement };
    case 'choice':
      return {
        key: line.key,
        clause: line.clause,
        tried: line.tried.map(({ left, relation, right, holds }) => ({
          left,
          relation,
          right,
          holds,
        })),
      };
    case 'notice':
      return { key: line.key, clause: line.clause, severity: line.severity, code: line.code };
    case 'section':
      return { key: line.key };
    default: {
      const { title: _title, print: _print, ...rest } = line;
      return rest;
    }
  }
}

/** What `resultHash` covers: engine, standard, method, units, inputs in base units, all lines. */
export const resultText = (record: CalculationRecord): string =>
  canonicalText({
    format: record.format,
    engine: record.program.engine,
    standard: record.standard,
    design: record.design,
    units: record.units,
    analysis: record.analysis,
    members: record.members.map((m) => ({
      section: m.section,
      verdict: m.summary.verdict,
      ratio: m.summary.ratio,
      lines: m.lines.map(resultOf),
      combinations: m.combinations.map((c) => ({
        verdict: c.summary.verdict,
        ratio: c.summary.ratio,
        lines: c.lines.map(resultOf),
      })),
    })),
  });

/** Puts both hashes on a record that is made to be kept. */
export function sealRecord(record: CalculationRecord): CalculationRecord {
  const resultHash = sha256Hex(resultText(record));
  const open = { ...record, resultHash, snapshotHash: null };
  return { ...open, snapshotHash: sha256Hex(canonicalText(open)) };
}

/** The hashes that a record should carry, to compare with those it carries. */
export function hashesOf(record: CalculationRecord): { resultHash: string; snapshotHash: string } {
  const resultHash = sha256Hex(resultText(record));
  return { resultHash, snapshotHash: sha256Hex(canonicalText({ ...record, snapshotHash: null })) };
}
