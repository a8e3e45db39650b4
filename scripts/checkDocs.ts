import { existsSync, readFileSync, readdirSync, statSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

/**
 * Keeps the documents honest: files and folders that README and DEVELOPERS name exist, links lead somewhere, and every published
 * value carries its source and tolerance.
 */
const root = resolve(dirname(fileURLToPath(import.meta.url)), '..');
const faults: string[] = [];

for (const name of ['README.md', 'DEVELOPERS.md', 'shared/engineering/README.md']) {
  const file = join(root, name);
  if (!existsSync(file)) {
    faults.push(`${name} is missing`);
    continue;
  }
  const text = readFileSync(file, 'utf8');
  for (const [, target] of text.matchAll(/\]\(([^)#]+)(?:#[^)]*)?\)/g)) {
    if (target === undefined || /^https?:/.test(target)) continue;
    if (!existsSync(resolve(dirname(file), target))) faults.push(`${name}: the link to ${target} leads nowhere`);
  }
  for (const [, path] of text.matchAll(/`((?:client|server|shared|scripts|e2e|fixtures)\/[\w./-]+)`/g)) {
    if (path !== undefined && !existsSync(join(root, path))) faults.push(`${name}: ${path} does not exist`);
  }
}

/** Lists of published values; a folder of program input and output beside them says its source in its own README. */
function publishedLists(folder: string): string[] {
  if (!existsSync(folder)) return [];
  return readdirSync(folder).flatMap((name) => {
    const path = join(folder, name);
    if (!statSync(path).isDirectory()) return path.endsWith('.json') ? [path] : [];
    if (!existsSync(join(path, 'README.md'))) faults.push(`fixtures/published/${name} has no README with its source`);
    return [];
  });
}

for (const file of publishedLists(join(root, 'fixtures', 'published'))) {
  const content: unknown = JSON.parse(readFileSync(file, 'utf8'));
  const cases: unknown[] = Array.isArray(content) ? content : [content];
  for (const entry of cases) {
    const fields = new Map(Object.entries(entry ?? {}));
    for (const field of ['id', 'source', 'provenance', 'tolerance']) {
      if (!fields.get(field))
        faults.push(`${file.slice(root.length + 1)}: ${String(fields.get('id'))} has no ${field}`);
    }
  }
}

for (const fault of faults) console.error(fault);
console.log(faults.length === 0 ? 'documents: all links and sources stand' : `documents: ${faults.length} faults`);
process.exit(faults.length === 0 ? 0 : 1);
