import fc from 'fast-check';
import { describe, expect, it } from 'vitest';

import { readSettings, readSettingsPatch, settingsPatchSchema, typedSettings } from './settings.ts';

import type { Settings } from '../engineering/input.ts';

const least = { name: 'Linden Court', units: 'us' };
function settingsOf(json: unknown): Settings {
  const outcome = readSettings(json);
  if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
  return outcome.settings;
}
function columnsOf(json: unknown): (string | null)[] {
  const outcome = readSettings(json);
  return outcome.ok ? [] : outcome.problems.map(({ column }) => column);
}

describe('readSettings', () => {
  it('fills in the defaults of the contract in US units', () => {
    expect(settingsOf(least)).toMatchObject({
      name: 'Linden Court',
      number: '',
      code: 'aci318-19',
      loads: 'asce7-22',
      wallClass: 'ordinary',
      fc: 5000,
      fy: 60,
      fyt: 60,
      lambda: 1,
      concreteWeight: 150,
      selfWeight: true,
      cover: 0.75,
      edge: 3,
      joint: 'roughened',
      slabThickness: 8,
      stiffness: { flexure: 0.5, shear: 1, end: 'cantilever', unitWeight: null },
      basis: ['rigid', 'compatible'],
      accidental: 0.05,
      liveFactor: 1,
      omega0: 2.5,
      cd: 5,
      riskCategory: 'II',
      windDriftFactor: 0.6,
      bandStories: 3,
      mergeShare: 0,
      given: ['name', 'units'],
    });
  });

  it('fills in the defaults of the contract in SI units', () => {
    const settings = settingsOf({ name: 'Linden Court', units: 'si' });
    expect(settings).toMatchObject({
      fc: 35,
      fy: 420,
      fyt: 420,
      concreteWeight: 24,
      cover: 20,
      edge: 75,
      slabThickness: 200,
    });
    expect(settings.bars.web).toEqual({
      sizes: [13, 16, 19, 22, 25],
      spacings: [150, 200, 225, 250, 300, 350, 400, 450],
    });
    expect(settings.bars.ties.spacings).toEqual([75, 90, 100, 115, 125, 150, 200]);
  });

  it('keeps what was typed and says what that was', () => {
    const settings = settingsOf({
      ...least,
      fc: 6000,
      stiffness: { flexure: 0.35 },
      bars: { web: { sizes: [6, 4, 4] } },
      sdc: null,
    });
    expect(settings.stiffness).toEqual({ flexure: 0.35, shear: 1, end: 'cantilever', unitWeight: null });
    expect(settings.bars.web).toEqual({ sizes: [4, 6], spacings: [6, 8, 9, 10, 12, 14, 16, 18] });
    expect(settings.given).toEqual(['name', 'units', 'fc', 'stiffness.flexure', 'bars.web.sizes']);
  });

  it('reads its own typed settings back to the same', () => {
    const settings = settingsOf({
      ...least,
      number: '7',
      fc: 6000,
      stiffness: { flexure: 0.35, unitWeight: 145 },
      bars: { ends: { sizes: [7] } },
      expectedBaseShear: { WX: 84 },
      basis: ['rigid'],
    });
    expect(settingsOf(typedSettings(settings))).toEqual(settings);
    expect(settingsOf(JSON.parse(JSON.stringify(typedSettings(settings))))).toEqual(settings);
  });

  it.each<[Record<string, unknown>, string[]]>([
    [{ units: 'us' }, ['name']],
    [{ name: 'A' }, ['units']],
    [{ ...least, name: '  ' }, ['name']],
    [{ ...least, name: 'A\nB' }, ['name']],
    [{ ...least, fc: -1 }, ['fc']],
    [{ ...least, fc: 35 }, ['fc']],
    [{ ...least, fy: 420 }, ['fy']],
    [{ ...least, concreteWeight: 24 }, ['concreteWeight']],
    [{ ...least, lambda: 0 }, ['lambda']],
    [{ ...least, selfWeight: 'yes' }, ['selfWeight']],
    [{ ...least, bandStories: 0 }, ['bandStories']],
    [{ ...least, bandStories: 2.5 }, ['bandStories']],
    [{ ...least, liveFactor: 0.3 }, ['liveFactor']],
    [{ ...least, accidental: 1.5 }, ['accidental']],
    [{ ...least, basis: [] }, ['basis']],
    [{ ...least, basis: 'rigid' }, ['basis']],
    [{ ...least, basis: ['rigid', 'rigid'] }, ['basis']],
    [{ ...least, basis: ['envelope'] }, ['basis']],
    [{ ...least, expectedBaseShear: { WX: 'much' } }, ['expectedBaseShear.WX']],
    [{ ...least, bars: { web: { sizes: [12] } } }, ['bars.web.sizes']],
    [{ ...least, bars: { ties: { spacings: [0] } } }, ['bars.ties.spacings.0']],
    [{ ...least, bars: { walls: {} } }, ['bars.walls']],
    [{ ...least, stiffnes: {} }, ['stiffnes']],
    [{ ...least, riskCategory: 2 }, ['riskCategory']],
    [{ ...least, fy: null }, ['fy']],
    [{ ...least, toString: 1, fyt: '60' }, ['fyt', 'toString']],
  ])('refuses %j', (json, columns) => {
    expect(columnsOf(json)).toEqual(columns);
  });

  it.each([null, 5, 'us', [], undefined])('refuses %j as a whole', (json) => {
    expect(columnsOf(json)).toEqual([null]);
  });

  it('names the nearest key', () => {
    const outcome = readSettings({ ...least, wallclass: 'ordinary', bandStorys: 3 });
    if (outcome.ok) throw new Error('unknown keys were taken');
    expect(outcome.problems.map(({ message }) => message).join()).toMatch(
      /wallClass may be meant.*bandStories may be meant/,
    );
  });

  it('says what was read and what was expected', () => {
    const outcome = readSettings({ ...least, joint: 'smooth' });
    if (outcome.ok) throw new Error('a joint that is none was taken');
    expect(outcome.problems[0]?.message).toBe('joint reads "smooth", expected one of roughened, plain; correct it');
  });

  it('accepts what later work will use and nothing depends on yet', () => {
    const later = {
      cd: 4.5,
      ie: 1.25,
      omega0: 2.5,
      riskCategory: 'III',
      driftLimit: 0.015,
      windDriftFactor: 0.7,
      sdc: 'D',
      kll: 2,
      loads: 'asce7-16',
      joint: 'plain',
    };
    expect(settingsOf({ ...least, ...later })).toMatchObject(later);
  });
});

describe('any JSON', () => {
  const known = fc.constantFrom(
    'name',
    'units',
    'fc',
    'basis',
    'bars',
    'stiffness',
    'expectedBaseShear',
    '__proto__',
    'constructor',
  );
  const anything = fc.oneof(fc.jsonValue(), fc.dictionary(known, fc.jsonValue()));
  it('gives settings or problems and never throws', () => {
    fc.assert(
      fc.property(anything, anything, (json, patch) => {
        const outcome = readSettings(json);
        expect(outcome.ok || outcome.problems.length > 0).toBe(true);
        const patched = readSettingsPatch(settingsOf(least), patch);
        expect(patched.ok || patched.problems.length > 0).toBe(true);
      }),
    );
  });

  it('refuses the keys of objects themselves', () => {
    expect(columnsOf(JSON.parse('{"name": "A", "units": "us", "__proto__": {"fc": 1}}'))).toEqual(['__proto__']);
    expect(readSettingsPatch(settingsOf(least), JSON.parse('{"__proto__": {"fc": 1}}')).ok).toBe(false);
  });
});

describe('ways of analysis', () => {
  it.each<[string, unknown]>([
    ['basis', ['rigid', 'compatible', 'flexible', 'envelope']],
    ['basis', ['flexible']],
    ['amplify', true],
    ['orthogonal', 0.3],
    ['windCases', true],
    ['liveReduction', true],
    ['forcesAre', 'story-shear'],
    ['forceLevel', 'service'],
    ['baseSprings', { W1: 4_000_000 }],
  ])('%s %j is taken', (key, value) => {
    expect(settingsOf({ ...least, [key]: value })).toMatchObject({ [key]: value });
  });
});

describe('what is not designed yet', () => {
  it.each<[string, unknown]>([
    ['code', 'aci318-14'],
    ['wallClass', 'special'],
    ['shearMethod', 'detailed'],
    ['criticalLevel', { W1: 'L2' }],
    ['mergeShare', 0.05],
  ])('%s %j', (key, value) => {
    const outcome = readSettings({ ...least, [key]: value });
    if (outcome.ok) throw new Error('taken');
    expect(outcome.problems).toHaveLength(1);
    expect(outcome.problems[0]).toMatchObject({ column: key, code: 'not-designed-yet' });
  });

  it('is said beside other problems', () => {
    expect(columnsOf({ ...least, wallClass: 'special', cover: 'thin' })).toEqual(['wallClass', 'cover']);
  });
});

describe('readSettingsPatch', () => {
  const current = settingsOf({ ...least, fy: 75, stiffness: { flexure: 0.35, end: 'fixed' } });
  const patched = (patch: unknown): Settings => {
    const outcome = readSettingsPatch(current, patch);
    if (!outcome.ok) throw new Error(JSON.stringify(outcome.problems));
    return outcome.settings;
  };

  it('changes what it names and nothing else', () => {
    expect(patched({ fc: 6000 })).toEqual({
      ...current,
      fc: 6000,
      given: ['name', 'units', 'fc', 'fy', 'stiffness.flexure', 'stiffness.end'],
    });
    expect(patched({})).toEqual(current);
  });

  it('reaches into stiffness and bars, and puts null back to the default', () => {
    expect(patched({ stiffness: { flexure: null, shear: 0.5 } }).stiffness).toEqual({
      flexure: 0.5,
      shear: 0.5,
      end: 'fixed',
      unitWeight: null,
    });
    expect(patched({ fy: null }).fy).toBe(60);
    expect(patched({ bars: { web: { sizes: [5] } } }).bars.web).toEqual({
      sizes: [5],
      spacings: [6, 8, 9, 10, 12, 14, 16, 18],
    });
    expect(patched({ stiffness: null }).stiffness.end).toBe('cantilever');
  });

  it('moves defaults along with the units', () => {
    const outcome = readSettingsPatch(settingsOf(least), { units: 'si' });
    expect(outcome).toMatchObject({ ok: true, settings: { units: 'si', fc: 35, cover: 20 } });
  });

  it('holds the same rules', () => {
    expect(readSettingsPatch(current, { name: null }).ok).toBe(false);
    expect(readSettingsPatch(current, { colour: 1 }).ok).toBe(false);
    expect(readSettingsPatch(current, { wallClass: 'special' }).ok).toBe(false);
    expect(readSettingsPatch(current, 'fc').ok).toBe(false);
    expect(settingsPatchSchema.safeParse({ fc: 1, colour: 1 }).success).toBe(false);
    expect(settingsPatchSchema.safeParse({ fc: null }).success).toBe(true);
  });
});
