import type { CodeRules } from '../codes/codeRules.ts';
import { rulesFor } from '../codes/rulesFor.ts';
import type { JointSurface, UnitSystem } from '../input.ts';
import type { ModelSettings } from '../model/model.ts';

import type { DetailLimits } from './detailLimits.ts';
import { detailLimits } from './detailLimits.ts';

/** What holds for every wall of a building: edition, round lengths, materials, cover. */
export interface DesignContext {
  readonly rules: CodeRules;
  readonly limits: DetailLimits;
  readonly units: UnitSystem;
  readonly fyKsi: number;
  readonly fytKsi: number;
  readonly lambda: number;
  /** to the outermost bar */
  readonly coverIn: number;
  readonly edgeIn: number;
  readonly joint: JointSurface;
  readonly sds: number;
  readonly oopEccentricityIn: number;
}

/** The context of a building's settings. */
export function designContext(settings: ModelSettings): DesignContext {
  return {
    rules: rulesFor(settings.code),
    limits: detailLimits[settings.units],
    units: settings.units,
    fyKsi: settings.fyKsi,
    fytKsi: settings.fytKsi,
    lambda: settings.lambda,
    coverIn: settings.coverIn,
    edgeIn: settings.edgeIn,
    joint: settings.joint,
    sds: settings.sds,
    oopEccentricityIn: settings.oopEccentricityIn,
  };
}
