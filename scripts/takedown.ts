import { mkdirSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';

import type { ResultDocument, ResultRow } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import { readFolder } from '#shared/csv/readFolder';
import { checkSection } from '#shared/result/checkSection';
import { runBuilding } from '#shared/result/runBuilding';

/**
 * The whole chain from a folder of tables: `takedown --in DIR [--out DIR] [--json] [--all-actions]`, or one section:
 * `takedown --section FILE.json`. Exit 0, or 2 where the input is refused.
 */
interface ProblemLine {
  readonly file: string;
  readonly row: number | null;
  readonly column: string | null;
  readonly message: string;
}

const usage = 'usage: takedown --in DIR [--out DIR] [--json] [--all-actions] | --section FILE.json';

/** The input was refused and everything said: nothing is left to do. */
class Refused extends Error {}

function refuse(problems: readonly ProblemLine[], json: boolean): never {
  // file descriptors may be pipes that are full for the moment: everything goes through the streams, and the process ends by itself
  for (const { file, row, column, message } of problems) {
    process.stderr.write(`${file}:${row ?? ''}:${column ?? ''}: ${message}\n`);
  }
  if (json) process.stdout.write(`${JSON.stringify({ problems })}\n`);
  process.exitCode = 2;
  throw new Refused();
}

function readFiles(folder: string): Map<string, Uint8Array> {
  try {
    const names = readdirSync(folder, { withFileTypes: true }).filter((entry) => entry.isFile());
    return new Map(names.map((entry) => [entry.name, readFileSync(join(folder, entry.name))]));
  } catch {
    return refuse([{ file: folder, row: null, column: null, message: 'no such folder, or it can’t be read' }], false);
  }
}

function runSection(file: string): void {
  let json: unknown;
  try {
    json = JSON.parse(readFileSync(file, 'utf8'));
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    return refuse([{ file, row: null, column: null, message: `can’t be read as JSON: ${message}` }], true);
  }
  const outcome = checkSection(json);
  if (!outcome.ok) {
    return refuse(
      outcome.problems.map(({ column, message }) => ({ file, row: null, column, message })),
      true,
    );
  }
  process.stdout.write(`${JSON.stringify(outcome.output)}\n`);
}

async function runFolder(folder: string, out: string | undefined, json: boolean, allActions: boolean): Promise<void> {
  const reading = readFolder(readFiles(folder));
  if (!reading.ok) return refuse(reading.problems, json);
  const outcome = runBuilding(reading.input, {
    now: () => performance.now(),
    allActions,
    notices: reading.notices.filter(({ code }) => code === 'file-notice' || code === 'no-gravity'),
  });
  if (!outcome.ok) {
    const lineOf = (table: string, row: number | null) =>
      row === null ? null : (Object.entries(reading.lines).find(([name]) => name === table)?.[1][row - 1] ?? null);
    return refuse(
      outcome.problems.map(({ table, row, column, message }) => ({
        file: table === 'building' ? 'building.json' : `${table}.csv`,
        row: lineOf(table, row),
        column,
        message,
      })),
      json,
    );
  }
  const { document } = outcome;
  const text = resultText(document);
  if (out !== undefined) {
    mkdirSync(out, { recursive: true });
    writeFileSync(join(out, 'result.json'), text);
    const { writeWorkbook } = await import('../server/workbook/writeWorkbook.ts');
    const workbook = await writeWorkbook({
      document,
      settings: reading.input.settings,
      rows: document.schedule.map(asScheduleRow),
      printedAt: new Date().toISOString(),
    });
    writeFileSync(join(out, 'schedule.xlsx'), workbook);
  }
  if (json || out === undefined) process.stdout.write(text);
}

/** One array a line, so that no single string has to hold a large building. */
function resultText(document: ResultDocument): string {
  return `${JSON.stringify(document)}\n`;
}

function asScheduleRow(row: ResultRow, index: number): ScheduleResourceRow {
  const { vertical, horizontal, ends, ties, laps, notes } = row;
  return {
    ...row,
    id: String(index + 1),
    version: 1,
    overwritten: [],
    automatic: { vertical, horizontal, ends, ties, laps, notes },
    reason: null,
  };
}

function readArguments() {
  try {
    return parseArgs({
      options: {
        in: { type: 'string' },
        out: { type: 'string' },
        json: { type: 'boolean', default: false },
        'all-actions': { type: 'boolean', default: false },
        section: { type: 'string' },
      },
    }).values;
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n${usage}\n`);
    process.exit(1);
  }
}

const values = readArguments();
try {
  if (values.section !== undefined) runSection(values.section);
  else if (values.in !== undefined) await runFolder(values.in, values.out, values.json, values['all-actions']);
  else {
    process.stderr.write(`${usage}\n`);
    process.exitCode = 1;
  }
} catch (error) {
  if (!(error instanceof Refused)) throw error;
}
