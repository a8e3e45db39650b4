import type { z } from 'zod';

function valueAt(json: unknown, path: readonly PropertyKey[]): unknown {
  let value = json;
  for (const key of path)
    value = typeof value === 'object' && value !== null ? (value as Record<PropertyKey, unknown>)[key] : undefined;
  return value;
}

function printed(value: unknown): string {
  const text =
    value === undefined ? 'nothing' : typeof value === 'number' ? String(value) : (JSON.stringify(value) ?? 'nothing');
  return text.length > 60 ? `${text.slice(0, 60)}...` : text;
}

function expectation(issue: z.core.$ZodIssue): string {
  switch (issue.code) {
    case 'invalid_type':
      return (
        {
          number: 'a number',
          int: 'a whole number',
          string: 'text',
          boolean: 'true or false',
          array: 'a list',
          object: 'an object',
          record: 'an object',
        }[issue.expected as string] ?? issue.expected
      );
    case 'invalid_value':
      return `one of ${issue.values.map(String).join(', ')}`;
    case 'too_small':
      if (issue.origin === 'string') return 'text that is not blank';
      if (issue.origin === 'array') return `at least ${issue.minimum} in the list`;
      return issue.inclusive ? `a number of at least ${issue.minimum}` : `a number above ${issue.minimum}`;
    case 'too_big':
      if (issue.origin === 'string') return `at most ${issue.maximum} characters`;
      if (issue.origin === 'array') return `at most ${issue.maximum} in the list`;
      return issue.inclusive === false ? `a number below ${issue.maximum}` : `a number of at most ${issue.maximum}`;
    case 'invalid_format':
      return 'text without line breaks and control characters';
    default:
      return 'another value';
  }
}

/** What was read at the key and what was expected there, for one complaint of the schema. */
export function settingsMessage(issue: z.core.$ZodIssue, json: unknown): string {
  const path = issue.path.join('.');
  const value = valueAt(json, issue.path);
  const remedy = value === undefined ? 'add the key' : 'correct it';
  return `${path} reads ${printed(value)}, expected ${expectation(issue)}; ${remedy}`;
}
