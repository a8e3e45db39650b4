/**
 * One-constant and one-sign changes of the engine. Each line: what it is, file under shared/, text as it stands (once in the file),
 * text as it is changed. A line whose text is no longer there, or there twice, stops the run: the list follows the engine.
 */
const section = 'engineering/wall-design/sectionCurve.ts';
const strength = 'engineering/wall-design/flexuralStrength.ts';
const code = 'engineering/codes/aci31819.ts';
const shear = 'engineering/wall-design/shearStrength.ts';
const joint = 'engineering/wall-design/jointStrength.ts';
const checks = 'engineering/wall-design/strengthChecks.ts';
const needed = 'engineering/wall-design/steelNeeded.ts';
const layers = 'engineering/wall-design/barLayers.ts';
const anchorage = 'engineering/wall-design/developmentLength.ts';
const laps = 'engineering/wall-design/rowLaps.ts';
const limits = 'engineering/wall-design/detailLimits.ts';
const details = 'engineering/wall-design/detailChecks.ts';
const tiesFile = 'engineering/wall-design/endTies.ts';
const fit = 'engineering/wall-design/barFit.ts';
const bars = 'engineering/wall-design/bars.ts';
const aid = 'engineering/wall-design/outOfPlaneStress.ts';
const closed = 'engineering/wall-design/closedFormMoment.ts';
const steel = 'engineering/wall-design/reinforcement.ts';
const rigidity = 'engineering/rigidity/wallRigidity.ts';
const modulus = 'engineering/rigidity/concreteModulus.ts';
const story = 'engineering/distribution/storyStiffness.ts';
const rigid = 'engineering/distribution/rigidBasis.ts';
const lateral = 'engineering/distribution/lateralActions.ts';
const loads = 'engineering/model/buildLoads.ts';
const stories = 'engineering/model/buildStories.ts';
const walls = 'engineering/model/buildWalls.ts';
const gravity = 'engineering/takedown/gravityTakedown.ts';
const moments = 'engineering/takedown/lateralMoments.ts';
const expand = 'engineering/combinations/expandCombinations.ts';
const demand = 'engineering/combinations/wallDemand.ts';
const balance = 'engineering/balance/balanceLines.ts';
const units = 'engineering/units.ts';
const defaults = 'combination-text/defaultCombinations.ts';
const linear = 'combination-text/linearFactors.ts';
const mass = 'engineering/schedule/rowMass.ts';

export const mutationList = [
  // section strength
  ['crushing strain 0.003 to 0.0035', code, 'crushingStrain: 0.003', 'crushingStrain: 0.0035'],
  ['0.85 of the block to 0.80', section, '(0.85 * section.fcPsi)', '(0.8 * section.fcPsi)'],
  ['beta1 largest 0.85 to 0.90', code, 'Math.min(0.85, 0.85 - (', 'Math.min(0.9, 0.9 - ('],
  ['beta1 slope 0.05 to 0.06', code, '(0.05 * (fcPsi', '(0.06 * (fcPsi'],
  ['beta1 starts at 4000 to 4500 psi', code, '(fcPsi - 4000)', '(fcPsi - 4500)'],
  ['beta1 least 0.65 to 0.60', code, 'Math.max(0.65, Math.min', 'Math.max(0.6, Math.min'],
  ['beta1 least 0.65 to 0.70', code, 'Math.max(0.65, Math.min', 'Math.max(0.7, Math.min'],
  ['steel modulus 29000 to 30000', section, 'steelModulusKsi = 29000', 'steelModulusKsi = 30000'],
  ['phi compression 0.65 to 0.70', code, 'phiCompression: 0.65', 'phiCompression: 0.7'],
  ['phi tension 0.90 to 0.85', code, 'phiTension: 0.9', 'phiTension: 0.85'],
  ['tension-controlled ety + 0.003 to + 0.004', code, 'yieldStrain + 0.003', 'yieldStrain + 0.004'],
  ['tension-controlled ety + 0.003 to 0.005 flat', code, '=> yieldStrain + 0.003', '=> Math.max(yieldStrain, 0.005)'],
  ['0.80 Po to 0.85', code, 'axialCapFactor: 0.8', 'axialCapFactor: 0.85'],
  ['displaced concrete not deducted', section, 'constantKip -= areaIn2 * blockKsi', 'constantKip -= 0 * blockKsi'],
  ['displaced concrete to c instead of beta1 c', section, 'if (x < beta1 * c)', 'if (x < c)'],
  ['moment about the compression face', section, 'const arm = halfIn - x;', 'const arm = -x;'],
  ['block arm: half its depth left out', section, 'm2 = (-p1 * beta1) / 2', 'm2 = -p1 * beta1'],
  [
    'untied bars in compression count',
    section,
    'if (strain > 0 && !compression) continue;',
    'if (strain > 9 && !compression) continue;',
  ],
  ['tension limit without 0.90', section, 'phiTensionKip: -rules.phiTension * steelIn2', 'phiTensionKip: -steelIn2'],
  ['Po without displaced concrete', section, 'areaIn2 * (axialFyKsi - blockKsi)', 'areaIn2 * axialFyKsi'],
  ['phi by yield of c, farthest bar wrong', section, 'farIn = Math.max(farIn, layer.positionIn)', 'farIn = lengthIn'],
  ['largest phi Mn instead of the smallest', strength, 'phiMnKipIn < best.phiMnKipIn', 'phiMnKipIn > best.phiMnKipIn'],
  ['fy for flexure cap 100 to 80', code, 'fyFlexureKsi: 100', 'fyFlexureKsi: 80'],
  ['fy for Po cap 80 to 100', code, 'fyAxialKsi: 80', 'fyAxialKsi: 100'],
  ['closed form 0.5 to 0.55', closed, '0.5 * wall.lengthIn', '0.55 * wall.lengthIn'],
  ['closed form 2 w to w', closed, '(2 * omega + 0.85', '(omega + 0.85'],
  // shear
  ['alpha_c 3 to 3.3', code, 'Math.min(3, 3 - 2 *', 'Math.min(3.3, 3.3 - 2 *'],
  ['alpha_c 2 to 1.9', code, 'return Math.max(2, Math.min(3', 'return Math.max(1.9, Math.min(3'],
  ['alpha_c slope 2 to 1.8', code, '3 - 2 * (heightOverLength', '3 - 1.8 * (heightOverLength'],
  ['alpha_c from 1.5 to 1.4', code, '(heightOverLength - 1.5)', '(heightOverLength - 1.4)'],
  ['alpha_c in tension 500 to 400', code, '/ (500 * grossAreaIn2)', '/ (400 * grossAreaIn2)'],
  ['alpha_c in tension sign', code, '2 * (1 + (netAxialKip', '2 * (1 - (netAxialKip'],
  ['alpha_c in tension below 0', code, 'Math.max(0, 2 * (1', 'Math.max(-9, 2 * (1'],
  ['alpha_c takes the sign of Nu the other way', code, 'if (netAxialKip < 0)', 'if (netAxialKip > 0)'],
  ['phi shear 0.75 to 0.85', code, 'phiShear: 0.75', 'phiShear: 0.85'],
  ['shear limit 8 to 10', code, 'limitFactor: 8', 'limitFactor: 10'],
  ['sqrt(f_c) cap 100 to 110', code, 'rootFcPsi: 100', 'rootFcPsi: 110'],
  ['fyt cap 60 to 80', code, 'fytShearKsi: 60', 'fytShearKsi: 80'],
  ['lambda dropped from Vc', shear, '(factor * wall.lambda * rootFcPsi', '(factor * rootFcPsi'],
  ['d = 0.8 lw for Acv', shear, 'const vsKip = horizontalRatio *', 'const vsKip = 0.8 * horizontalRatio *'],
  ['low-shear limit 0.5 to 0.6', shear, 'return 0.5 * rules.phiShear', 'return 0.6 * rules.phiShear'],
  ['low-shear limit without phi', shear, 'return 0.5 * rules.phiShear * concreteShear', 'return 0.5 * concreteShear'],
  ['rho_t needed without phi', shear, 'Math.abs(shearKip) / rules.phiShear, bare', 'Math.abs(shearKip), bare'],
  ['Vn not cut at the limit', shear, 'Math.min(vcKip + vsKip, limitKip)', '(vcKip + vsKip)'],
  ['hw of the wall is the story', checks, 'wallHeightIn, fytKsi', 'wallHeightIn: section.storyHeightIn, fytKsi'],
  // distributed steel, spacing, curtains, thickness
  ['0.0012 to 0.0010', code, 'vertical: 0.0012', 'vertical: 0.001'],
  ['0.0020 to 0.0018', code, 'horizontal: 0.002 }', 'horizontal: 0.0018 }'],
  ['0.0015 to 0.0012', code, 'vertical: 0.0015', 'vertical: 0.0012'],
  ['0.0025 low shear to 0.0020', code, 'vertical: 0.0015, horizontal: 0.0025', 'vertical: 0.0015, horizontal: 0.002'],
  ['0.0025 rho_t to 0.0020', code, 'horizontal: 0.0025,', 'horizontal: 0.002,'],
  ['rho_l bracket 0.5 to 0.4', code, '0.0025 + 0.5 * Math.max', '0.0025 + 0.4 * Math.max'],
  ['rho_l bracket 2.5 to 2.0', code, '2.5 - heightOverLength', '2 - heightOverLength'],
  ['rho_l without rho_t for strength as bound', code, '(provided - 0.0025), forStrength)', '(provided - 0.0025), 9)'],
  ['rho_l bracket below 0', code, '0.5 * Math.max(0, 2.5', '0.5 * Math.max(-9, 2.5'],
  ['small bar up to No. 6', limits, 'smallBar: 5', 'smallBar: 6'],
  ['small bar up to soft-metric 19', limits, 'smallBar: 16', 'smallBar: 19'],
  ['small bar whatever the grade', needed, 'gradeKsi >= 60 - 1e-6', 'gradeKsi >= 30 - 1e-6'],
  [
    'vertical ratio by the horizontal bar',
    needed,
    'isSmallBar(vertical, context.fyKsi',
    'isSmallBar(horizontal, context.fyKsi',
  ],
  [
    'horizontal ratio by the vertical bar',
    needed,
    'isSmallBar(horizontal, context.fytKsi',
    'isSmallBar(vertical, context.fytKsi',
  ],
  ['3 t to 4 t', needed, '3 * thicknessIn', '4 * thicknessIn'],
  ['18 in to 24 in', limits, 'spacingIn: 18', 'spacingIn: 24'],
  ['450 mm to 500 mm', limits, 'spacingIn: 450', 'spacingIn: 500'],
  ['lw/3 to lw/2', needed, 'lengthIn / 3', 'lengthIn / 2'],
  ['lw/5 to lw/4', needed, 'lengthIn / 5', 'lengthIn / 4'],
  ['lw/3 also in low shear', needed, 'if (low) return', 'if (!low) return'],
  ['two curtains above 12 in', limits, 'oneCurtainThicknessIn: 10', 'oneCurtainThicknessIn: 12'],
  ['two curtains at 10 in', needed, 'oneCurtainThicknessIn * (1 + 1e-9)', 'oneCurtainThicknessIn * (1 - 1e-9)'],
  ['two curtains above 300 mm', limits, 'oneCurtainThicknessIn: 250', 'oneCurtainThicknessIn: 300'],
  ['least thickness 4 to 3 in', limits, 'leastThicknessIn: 4', 'leastThicknessIn: 3'],
  [
    'curtains: the larger of the two',
    details,
    'Math.min(bars.curtains, horizontal.curtains)',
    'Math.max(bars.curtains, horizontal.curtains)',
  ],
  ['web ratio of one curtain', layers, '(curtains * bar.areaIn2) / (spacingIn', '(bar.areaIn2) / (spacingIn'],
  // bars in the section
  [
    'web: a space less',
    layers,
    'Math.ceil(runIn / bars.webSpacingIn - 1e-9)',
    'Math.floor(runIn / bars.webSpacingIn + 1e-9)',
  ],
  ['web bars one more', layers, 'index < spaces; index += 1', 'index <= spaces; index += 1'],
  ['web bars of one curtain', layers, 'bars.curtains * bars.web.areaIn2;\n  for', 'bars.web.areaIn2;\n  for'],
  [
    'end columns to the end of the zone',
    layers,
    'ends.lengthIn - 2 * edgeIn) / (columns - 1)',
    'ends.lengthIn - edgeIn) / (columns - 1)',
  ],
  ['end columns over columns', layers, '/ (columns - 1)', '/ columns'],
  [
    'end area per column',
    layers,
    '(bars.ends.count * bars.ends.bar.areaIn2) / columns.length',
    'bars.ends.bar.areaIn2',
  ],
  ['far end zone not mirrored', layers, 'positionIn: lengthIn - positionIn, areaIn2', 'positionIn, areaIn2'],
  ['web starts at the zone limit', layers, 'bars.ends.lengthIn - bars.edgeIn);', 'bars.ends.lengthIn);'],
  ['end ratio of one bar', layers, '(ends.count * ends.bar.areaIn2) / (ends', '(ends.bar.areaIn2) / (ends'],
  ['No. 5 0.31 to 0.30', bars, '[5, 0.625, 0.31', '[5, 0.625, 0.3'],
  ['No. 9 diameter 1.128 to 1.125', bars, '[9, 1.128', '[9, 1.125'],
  ['soft-metric 16 199 to 200 mm2', bars, '[16, 15.9, 199', '[16, 15.9, 200'],
  ['No. 6 weight 1.502 to 1.520', bars, '0.44, 1.502', '0.44, 1.52'],
  // ties
  ['16 bar diameters to 18', tiesFile, '16 * ends.bar', '18 * ends.bar'],
  ['48 tie diameters to 60', tiesFile, '48 * tie.diameterIn', '60 * tie.diameterIn'],
  ['tie spacing without thickness', tiesFile, 'tie.diameterIn, thicknessIn, ends', 'tie.diameterIn, ends'],
  ['tie spacing without zone length', tiesFile, 'thicknessIn, ends.lengthIn)', 'thicknessIn)'],
  ['No. 3 ties to No. 11', tiesFile, 'table[7]', 'table[8]'],
  ['unsupported bar 6 in to 9 in', limits, 'sixIn: 6', 'sixIn: 9'],
  ['alternate legs', tiesFile, 'Math.floor(columns.length / 2) + 1', 'Math.floor(columns.length / 2)'],
  ['ties above 0.01 to 0.02', code, 'tiesAboveRatio: 0.01', 'tiesAboveRatio: 0.02'],
  ['web counts in compression', steel, 'web: false, ends: tied', 'web: true, ends: tied'],
  ['end bars count untied', steel, 'ends: tied && bars.ends !== null', 'ends: bars.ends !== null'],
  // joint
  ['mu 1.0 to 1.4', code, "=== 'roughened' ? 1 : 0.6)", "=== 'roughened' ? 1.4 : 0.6)"],
  ['mu 0.6 to 0.7', code, '? 1 : 0.6)', '? 1 : 0.7)'],
  ['joint 0.2 f_c roughened to 0.25', code, 'Math.min(0.2 * fcPsi, 480', 'Math.min(0.25 * fcPsi, 480'],
  ['joint 480 to 400', code, '480 + 0.08', '400 + 0.08'],
  ['joint 0.08 to 0.10', code, '0.08 * fcPsi', '0.1 * fcPsi'],
  ['joint 1600 to 1800', code, '0.08 * fcPsi, 1600', '0.08 * fcPsi, 1800'],
  ['joint 0.2 f_c plain to 0.25', code, 'Math.min(0.2 * fcPsi, 800', 'Math.min(0.25 * fcPsi, 800'],
  ['joint 800 to 1000', code, '0.2 * fcPsi, 800', '0.2 * fcPsi, 1000'],
  ['joint fy cap 60 to 80', code, 'fyFrictionKsi: 60', 'fyFrictionKsi: 80'],
  ['joint lambda dropped', code, '? 1 : 0.6) * lambda', '? 1 : 0.6) * 1'],
  ['joint N not counted', joint, 'frictionIn2 * fyKsi + compressionKip', 'frictionIn2 * fyKsi'],
  [
    'joint N larger of the two',
    joint,
    'Math.min(deadFactor * deadKip, axialKip)',
    'Math.max(deadFactor * deadKip, axialKip)',
  ],
  ['joint tension not taken from Avf', joint, 'steelIn2 - tensionIn2', 'steelIn2'],
  [
    'joint tension without 0.90',
    joint,
    'const tensionIn2 = Math.max(0, -axialKip) / (rules.phiTension * joint.fyKsi)',
    'const tensionIn2 = Math.max(0, -axialKip) / joint.fyKsi',
  ],
  ['0.9 D to 1.0 D at the joint', checks, ': 0.9;', ': 1;'],
  ['0.9 - 0.2 SDS at the joint', checks, '0.9 - 0.2 * context.sds', '0.9 + 0.2 * context.sds'],
  ['0.2 SDS to 0.14 SDS at the joint', checks, '0.9 - 0.2 * context.sds', '0.9 - 0.14 * context.sds'],
  // out-of-plane aid
  ['0.55 f_c to 0.60', aid, '0.55 * wall.fcPsi', '0.6 * wall.fcPsi'],
  ['32 t to 30 t', aid, '(32 * thicknessIn)', '(30 * thicknessIn)'],
  ['6 M to 4 M', aid, '(6 * Math.abs', '(4 * Math.abs'],
  ['t/6 to t/3', aid, 'thicknessIn / 6', 'thicknessIn / 3'],
  ['slenderness not squared', aid, '1 - slenderness * slenderness', '1 - slenderness'],
  // development
  ['3/40 to 0.08', anchorage, '0.075 * input.fyPsi', '0.08 * input.fyPsi'],
  ['psi_t 1.3 to 1.0', anchorage, 'anchored.horizontal ? 1.3 : 1', 'anchored.horizontal ? 1 : 1'],
  ['psi_s 0.8 to 1.0', code, '? 0.8 : 1)', '? 1 : 1)'],
  ['psi_s to No. 7', code, 'diameterIn <= 0.76', 'diameterIn <= 0.9'],
  ['psi_g 1.15 to 1.0', code, '? 1.15 : 1.3', '? 1 : 1.3'],
  ['psi_g 1.3 to 1.2', code, '? 1.15 : 1.3', '? 1.15 : 1.2'],
  ['class B 1.3 to 1.0', anchorage, '1.3 * developmentLength', '1 * developmentLength'],
  ['least ld 12 in to 8', limits, 'leastDevelopmentIn: 12', 'leastDevelopmentIn: 8'],
  ['least ld 300 mm to 200', limits, 'leastDevelopmentIn: 300', 'leastDevelopmentIn: 200'],
  ['cb/db 2.5 to 3', anchorage, 'Math.min(2.5', 'Math.min(3'],
  ['cb by the whole spacing', anchorage, 'anchored.spacingIn / 2', 'anchored.spacingIn'],
  ['lambda dropped from ld', anchorage, '(input.lambda * root)', 'root'],
  ['horizontal bars not psi_t', laps, 'horizontal: true', 'horizontal: false'],
  [
    'vertical bar without the horizontal one outside',
    laps,
    'coverIn + horizontal.bar.diameterIn + bar.diameterIn / 2',
    'coverIn + bar.diameterIn / 2',
  ],
  ['largest lapped bar No. 14', limits, 'largestLappedBar: 11', 'largestLappedBar: 14'],
  ['hook 55 to 50', code, '/ (55 * lambda', '/ (50 * lambda'],
  ['hook psi_o 1.25 to 1', code, '1000 * 1.25 * strength', '1000 * strength'],
  ['hook 8 db to 6 db', anchorage, '8 * bar.diameterIn, rules', '6 * bar.diameterIn, rules'],
  ['clear 1.5 db to 1 db', fit, '1.5 * bar.diameterIn', '1 * bar.diameterIn'],
  ['clear 1.5 in to 1 in', limits, 'clearIn: 1.5', 'clearIn: 1'],
  ['laps not doubled', fit, 'bars.webSpacingIn - 2 * bars.web', 'bars.webSpacingIn - bars.web'],
  // rigidity and distribution
  ['57000 to 60000', modulus, '? 57000', '? 60000'],
  ['33 w^1.5 to 30', modulus, ': 33 *', ': 30 *'],
  ['0.4 G to 0.42', rigidity, '(0.4 * modulusKsi', '(0.42 * modulusKsi'],
  ['1.2 to 1.0', rigidity, '(1.2 * h)', '(1 * h)'],
  ['12 of the inertia', rigidity, 't * l * l * l) / 12', 't * l * l * l) / 10'],
  ['c_e left out', rigidity, '(wall.endFactor * modulusKsi', '(3 * modulusKsi'],
  ['c_e 3 to 12', 'engineering/model/toModel.ts', '12 : 3', '3 : 12'],
  [
    'sign of the torque arm',
    story,
    'segment.sin - (segment.centroidYIn - centerYIn) * segment.cos',
    'segment.sin + (segment.centroidYIn - centerYIn) * segment.cos',
  ],
  ['sign of the center in x', story, 'middleX + (kxx * kyt', 'middleX - (kxx * kyt'],
  ['sign of the center in y', story, 'middleY - (kyy * kxt', 'middleY + (kyy * kxt'],
  ['sign of Kxy in the solution', rigid, '(story.kyy * fx - story.kxy * fy)', '(story.kyy * fx + story.kxy * fy)'],
  [
    'sign of the torque about the center',
    rigid,
    'story.centerXIn * fy - story.centerYIn * fx',
    'story.centerXIn * fy + story.centerYIn * fx',
  ],
  ['sign of the torsional share', rigid, 'direct + torsional;', 'direct - torsional;'],
  ['no walls of the height above 1 in from one point', story, 'const onePointIn = 1;', 'const onePointIn = 100;'],
  ['parallel 0.5 to 5 degrees', story, 'parallelSine = 0.008726535498373935', 'parallelSine = 0.08715574274765817'],
  ['sign of accidental eccentricity', lateral, ': -accidental;', ': accidental;'],
  [
    'accidental: plus is minus',
    lateral,
    "variant === '+' ? accidental : -accidental",
    "variant === '+' ? -accidental : accidental",
  ],
  ['accidental by the other extent', lateral, 'level.extentXIn * (loadCase.fyKip', 'level.extentYIn * (loadCase.fyKip'],
  ['accidental: y part sign', lateral, '- level.extentYIn *', '+ level.extentYIn *'],
  ['accidental also for wind', lateral, "loadCase.kind === 'seismic' &&", "loadCase.kind !== 'other' &&"],
  ['torque of fx', loads, 'mz + x * fy - y * fx', 'mz + x * fy + y * fx'],
  ['mz left out', loads, 'index, mz + x', 'index, x'],
  ['point from the edge', stories, 'edge + extent / 2', 'edge - extent / 2'],
  ['point of the level for a row with its own x', loads, 'row.x === null ? story.xIn', 'row.x !== null ? story.xIn'],
  // takedown
  ['moments by half the height', moments, '(shearKip[at] ?? 0) * (model', '0.5 * (shearKip[at] ?? 0) * (model'],
  ['sign of gravity eccentricity', loads, 'kip * eccentricityIn', '-kip * eccentricityIn'],
  ['centroid shift sign', gravity, 'moment += axial * shiftIn', 'moment -= axial * shiftIn'],
  [
    'centroid shift after the story above only',
    gravity,
    '(above.centroidXIn - segment.centroidXIn)',
    '(segment.centroidXIn - above.centroidXIn)',
  ],
  ['self-weight gross of openings', gravity, '(1 - segment.opening)', '(1 - 0 * segment.opening)'],
  ['self-weight 1728', gravity, 'cubicInchesPerCubicFoot = 1728', 'cubicInchesPerCubicFoot = 1828'],
  [
    'self-weight in every case',
    gravity,
    "if (name === 'D') axial += selfWeightKip",
    "if (name !== 'D') axial += selfWeightKip",
  ],
  ['self-weight where not asked', gravity, 'if (!settings.selfWeight) return', 'if (settings.selfWeight) return'],
  ['balance: transferred left out', balance, 'if (!segment || fromStory <= story) continue;', 'if (segment) continue;'],
  ['balance: torque sign', balance, 'segment.sin - segment.centroidYIn', 'segment.sin + segment.centroidYIn'],
  [
    'balance: residual 0',
    balance,
    'residual: measure === 0 ? 0 : difference / measure',
    'residual: measure === 0 ? 0 : 0 * difference',
  ],
  ['roof live read as snow', loads, "Lr: 'roof_live', S: 'snow'", "Lr: 'snow', S: 'roof_live'"],
  ['own factor ignored', walls, 'row.flexure_factor ?? settings', 'settings'],
  ['own shear factor ignored', walls, 'row.shear_factor ?? settings', 'settings'],
  ['own f_c ignored', walls, '(row.fc ?? settings.fc)', '(settings.fc)'],
  // combinations
  ['1.4 D to 1.3', defaults, "'1.4D'", "'1.3D'"],
  ['1.2 D to 1.25 with L', defaults, '`1.2D + 1.6L', '`1.25D + 1.6L'],
  ['1.6 L to 1.5', defaults, '1.6L +', '1.5L +'],
  ['1.6 Lr to 1.5', defaults, '1.6Lr or 1.0S', '1.5Lr or 1.0S'],
  ['1.0 S to 1.6 of 7-22', defaults, 'or 1.0S or', 'or 1.6S or'],
  ['0.5 W to 0.8', defaults, 'or 0.5W', 'or 0.8W'],
  ['1.0 W to 1.6', defaults, '1.2D + 1.0W', '1.2D + 1.6W'],
  ['0.9 D + W to 1.0 D', defaults, "'0.9D + 1.0W'", "'1.0D + 1.0W'"],
  ['0.2 SDS to 0.14', defaults, '1.2 + 0.2SDS', '1.2 + 0.14SDS'],
  ['0.9 - 0.2 SDS to +', defaults, '0.9 - 0.2SDS', '0.9 + 0.2SDS'],
  ['rho left out', defaults, '(0.9 - 0.2SDS)D + rho E', '(0.9 - 0.2SDS)D + E'],
  ['0.15 S to 0.2 of 7-22', defaults, "'0.15S' : ", "'0.2S' : "],
  ['0.3 S to 0.5 of 7-22', defaults, '0.5Lr or 0.3S', '0.5Lr or 0.5S'],
  ['0.5 of 7-16 to 0.3', defaults, "'0.5(Lr or S or R)'", "'0.3(Lr or S or R)'"],
  ['f L to L', defaults, '`${printFactor(liveFactor)}L`', '`1.0L`'],
  ['minus acts as plus', expand, 'factor: -1', 'factor: 1'],
  ['variant 0 enters beside + and -', expand, "if (hasSenses && action.variant === '0') return [];", ''],
  ['factor of the lateral part dropped', expand, 'factor: part.factor * factor', 'factor: part.factor'],
  [
    'H both ways sign',
    expand,
    'parts: [{ action: index, factor: 1 }] }] : []',
    'parts: [{ action: index, factor: -1 }] }] : []',
  ],
  ['snow left out of demand', demand, 'factors.S * (axial.S[source] ?? 0)', '0 * (axial.S[source] ?? 0)'],
  ['roof live left out of demand', demand, 'factors.Lr * (axial.Lr[source] ?? 0)', '0 * (axial.Lr[source] ?? 0)'],
  ['gravity moment of D left out', demand, 'factors.D * (moment.D[source] ?? 0)', '0 * (moment.D[source] ?? 0)'],
  ['gravity moment of L left out', demand, 'factors.L * (moment.L[source] ?? 0)', '0 * (moment.L[source] ?? 0)'],
  ['minus read as plus', linear, 'added(left, right, -1)', 'added(left, right, 1)'],
  ['unary minus dropped', linear, 'scaled(left, -1)', 'scaled(left, 1)'],
  // units
  ['kip 4.448 to 4.45', units, 'newtonsPerPound = 4.4482216152605', 'newtonsPerPound = 4.45'],
  ['25.4 to 25', units, 'millimetersPerInch = 25.4', 'millimetersPerInch = 25'],
  ['SI moment without length', units, 'moment: inchesPerMeter / kilonewtonsPerKip', 'moment: 1 / kilonewtonsPerKip'],
  ['SI density', units, 'density: 1 / kilonewtonsPerCubicMeterPerPcf', 'density: 1 / 0.16'],
  ['SI stiffness', units, 'stiffness: millimetersPerInch / kilonewtonsPerKip', 'stiffness: 1 / kilonewtonsPerKip'],
  ['US moment factor', units, 'moment: inchesPerFoot', 'moment: 1'],
  [
    'header psf',
    units,
    "psf: { dimension: 'stress', inBase: lbf / (foot * foot) }",
    "psf: { dimension: 'stress', inBase: lbf / (inch * inch) }",
  ],
  ['header MN', units, "inBase: 1e6 },\n  'kip-ft'", "inBase: 1e3 },\n  'kip-ft'"],
  ['header kip-in', units, 'inBase: kip * inch', 'inBase: kip * foot'],
  [
    'psi per MPa',
    units,
    'newtonsPerPound / (millimetersPerInch * millimetersPerInch)',
    'newtonsPerPound / (25.4 * 25)',
  ],
  // quantities
  ['mass: end bars of one end', mass, '2 * bars.ends.count', '1 * bars.ends.count'],
  ['mass: horizontal hooks of 6 db', mass, '24 * horizontal.bar.diameterIn', '12 * horizontal.bar.diameterIn'],
  [
    'mass: one curtain of the web',
    mass,
    'webCount(bars, lengthIn) * bars.curtains * bars.web',
    'webCount(bars, lengthIn) * bars.web',
  ],
  ['mass: ties of one end', mass, 'const sets = 2 * rowsOf', 'const sets = rowsOf'],
  ['mass: no laps', mass, 'heightsIn.length * (lapIn ?? 0)', '0 * (lapIn ?? 0)'],
  ['stock bars of 40 ft', limits, 'stockIn: 720', 'stockIn: 480'],
];
