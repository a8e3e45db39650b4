import type { CodeEdition } from '../input.ts';

import { aci31819 } from './aci31819.ts';
import type { CodeRules } from './codeRules.ts';

const editions: Partial<Record<CodeEdition, CodeRules>> = { 'aci318-19': aci31819 };

/** The rules of an edition. Inputs that name an edition without rules are refused before design; reaching here is a defect and throws. */
export function rulesFor(edition: CodeEdition): CodeRules {
  const rules = editions[edition];
  if (!rules) throw new Error(`no rules for ${edition}`);
  return rules;
}
