import { parseNumber } from '#shared/csv/parseNumber';

import type { SettingField } from './settingFields.ts';

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

export function valueAt(settings: unknown, path: string): unknown {
  return path.split('.').reduce<unknown>((value, part) => (isObject(value) ? value[part] : undefined), settings);
}

/** A stored setting as the text of its field. */
export function draftOf(value: unknown): string {
  if (value === null || value === undefined) return '';
  if (Array.isArray(value)) return value.map(String).join(' ');
  return typeof value === 'boolean' ? (value ? 'yes' : 'no') : String(value);
}

export type ReadDraft =
  { readonly ok: true; readonly value: unknown } | { readonly ok: false; readonly expected: string };

/** The text of a field as a setting; blank is null, which puts the default back. */
export function readDraft(field: SettingField, draft: string): ReadDraft {
  const text = draft.trim();
  if (text === '') return { ok: true, value: null };
  if (field.kind === 'switch') return { ok: true, value: text === 'yes' };
  if (field.kind === 'text' || field.kind === 'choice') return { ok: true, value: text };
  if (field.kind === 'number') {
    const read = parseNumber(text);
    return read.ok ? read : { ok: false, expected: `a number; ${read.remedy}` };
  }
  if (field.kind === 'set') return { ok: true, value: text.split(/\s+/) };
  const parts = text.split(/[\s;,]+/).filter((part) => part !== '');
  const values: number[] = [];
  for (const part of parts) {
    const read = parseNumber(part.replace(/^#/, ''));
    if (!read.ok) return { ok: false, expected: `numbers with spaces between, read ${part}` };
    values.push(read.value);
  }
  return { ok: true, value: values };
}

/** Puts a value at a path of nested keys. */
export function putAt(target: Record<string, unknown>, path: string, value: unknown): void {
  const parts = path.split('.');
  let at = target;
  parts.forEach((part, index) => {
    if (index === parts.length - 1) {
      at[part] = value;
      return;
    }
    const inner = at[part];
    const next: Record<string, unknown> = isObject(inner) ? { ...inner } : {};
    at[part] = next;
    at = next;
  });
}

/** Settings that are records by the name of a case or wall; names may hold points, so they are no paths. */
const recordKeys = ['expectedBaseShear', 'baseSprings'] as const;
export type RecordKey = (typeof recordKeys)[number];

/** `baseSprings.W1.5` as its record and name; null for a plain path. */
export function recordPath(path: string): { readonly key: RecordKey; readonly name: string } | null {
  const key = recordKeys.find((one) => path.startsWith(`${one}.`));
  return key === undefined ? null : { key, name: path.slice(key.length + 1) };
}
