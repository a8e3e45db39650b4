import type { SectionCheck, SectionFile, SectionFlexure, SectionOutput, SectionProblem } from '../contracts/section.ts';
import { sectionFileSchema } from '../contracts/section.ts';
import { settingsDefaults } from '../contracts/settingsDefaults.ts';
import { settingsMessage } from '../contracts/settingsMessage.ts';
import { rulesFor } from '../engineering/codes/rulesFor.ts';
import { unitFactors } from '../engineering/units.ts';
import type { DesignContext } from '../engineering/wall-design/designContext.ts';
import { detailLimits } from '../engineering/wall-design/detailLimits.ts';
import { designStrength, nominalStrength } from '../engineering/wall-design/flexuralStrength.ts';
import type { PlainCheck } from '../engineering/wall-design/plainCheck.ts';
import { sectionCurve } from '../engineering/wall-design/sectionCurve.ts';
import { shearStrength } from '../engineering/wall-design/shearStrength.ts';
import { shearWallOf } from '../engineering/wall-design/strengthChecks.ts';
import type { SectionInPlace } from '../engineering/wall-design/strengthChecks.ts';

import { sectionProblems } from './sectionProblems.ts';
import { sectionSteel } from './sectionSteel.ts';
import { sectionCheckUnit } from './sectionUnits.ts';

export type SectionOutcome =
  | { readonly ok: true; readonly output: SectionOutput }
  | { readonly ok: false; readonly problems: readonly SectionProblem[] };

function contextOf(file: SectionFile): DesignContext {
  const { units, code } = file;
  const factors = unitFactors[units];
  const defaults = settingsDefaults(units, code);
  return {
    rules: rulesFor(code),
    limits: detailLimits[units],
    units,
    fyKsi: (file.fy ?? defaults.fy) * factors.steelStrength,
    fytKsi: (file.fyt ?? defaults.fyt) * factors.steelStrength,
    lambda: file.lambda,
    coverIn: (file.cover ?? defaults.cover) * factors.barLength,
    edgeIn: (file.edge ?? defaults.edge) * factors.barLength,
    joint: file.joint,
    sds: 0,
    oopEccentricityIn: file.oopEccentricity * factors.barLength,
  };
}

function placeOf(file: SectionFile): SectionInPlace {
  const factors = unitFactors[file.units];
  const fcPsi = (file.fc ?? settingsDefaults(file.units, file.code).fc) * factors.concreteStrength;
  return {
    lengthIn: file.length * factors.planLength,
    thicknessIn: file.thickness * factors.barLength,
    fcPsi,
    storyHeightIn: file.height * factors.planLength,
    wallHeightIn: (file.totalHeight ?? file.height) * factors.planLength,
    joint: file.dead === undefined ? null : { fcPsi, deadKip: file.dead * factors.force },
  };
}

function printedCheck({ expansion, quantity, ...check }: PlainCheck, file: SectionFile): SectionCheck {
  const { unit, factor } = sectionCheckUnit(quantity, file.units);
  return {
    check: check.check,
    demand: check.demand / factor,
    capacity: check.capacity === null ? null : check.capacity / factor,
    unit,
    ratio: check.ratio,
    clause: check.clause,
    combination: expansion === null ? null : `action ${String(expansion + 1)}`,
    ok: check.ok,
  };
}

function computed(file: SectionFile): Omit<SectionOutput, 'ignored'> {
  const factors = unitFactors[file.units];
  const context = contextOf(file);
  const place = placeOf(file);
  const steel = sectionSteel(file, place, context);
  const curve = sectionCurve(steel.section, context.rules);
  const probable = sectionCurve(steel.section, context.rules, 1.25);
  const flexure = file.actions.map(({ axial }): SectionFlexure => {
    const axialKip = axial * factors.force;
    const design = designStrength(curve, axialKip);
    const nominal = nominalStrength(curve, axialKip);
    const mprKipIn = nominalStrength(probable, axialKip)?.mnKipIn;
    return {
      axial,
      phi: design && design.phi,
      c: design && design.cIn / factors.barLength,
      phiMn: design && design.phiMnKipIn / factors.moment,
      mn: design && design.mnKipIn / factors.moment,
      cNominal: nominal && nominal.cIn / factors.barLength,
      mnNominal: nominal && nominal.mnKipIn / factors.moment,
      mpr: mprKipIn === undefined ? null : mprKipIn / factors.moment,
    };
  });
  const wall = shearWallOf(place, context);
  const shear = file.actions.map(({ axial }) => {
    const strength = shearStrength(wall, steel.horizontalRatio, axial * factors.force, context.rules);
    return {
      vc: strength.vcKip / factors.force,
      vs: strength.vsKip / factors.force,
      vn: strength.vnKip / factors.force,
      phiVn: strength.phiVnKip / factors.force,
      limit: strength.limitKip / factors.force,
    };
  });
  return { checks: steel.checks.map((check) => printedCheck(check, file)), flexure, shear };
}

/**
 * One section file, parsed from JSON, to its checks and strengths, or to all of its problems. Strengths count all bars in tension and
 * compression (22.4); whether bars needed in compression are tied is the check `ties`. Laps are not part of a section and not checked.
 */
export function checkSection(json: unknown): SectionOutcome {
  const parsed = sectionFileSchema.safeParse(json);
  if (!parsed.success) {
    const problems = parsed.error.issues.map((issue): SectionProblem => ({
      column: issue.path.join('.') || null,
      message: settingsMessage(issue, json),
    }));
    return { ok: false, problems };
  }
  const problems = sectionProblems(parsed.data);
  if (problems.length > 0) return { ok: false, problems };
  const known = new Set(Object.keys(sectionFileSchema.shape));
  const ignored = Object.keys(json as object).filter((key) => !known.has(key));
  return { ok: true, output: { ...computed(parsed.data), ignored } };
}
