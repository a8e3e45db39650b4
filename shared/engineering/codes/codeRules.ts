import type { CodeEdition, JointSurface } from '../input.ts';

/**
 * What one edition of the concrete standard says, as data and small functions. The design asks this interface only, so that
 * another edition is one more file in this folder. Units: kip, inch, ksi; f'c in psi; Nu in kip, compression positive.
 */
export interface CodeRules {
  readonly edition: CodeEdition;
  readonly title: string;
  /** ultimate strain of concrete in compression */
  readonly crushingStrain: number;
  /** depth of the rectangular block over the depth of the neutral axis */
  readonly blockDepthFactor: (fcPsi: number) => number;
  readonly phiCompression: number;
  readonly phiTension: number;
  /** strain beyond yield at which a section counts as tension-controlled */
  readonly tensionControlledStrain: (yieldStrain: number) => number;
  /** Pn,max over Po */
  readonly axialCapFactor: number;
  readonly phiShear: number;
  readonly caps: {
    readonly rootFcPsi: number;
    readonly fyFlexureKsi: number;
    readonly fyAxialKsi: number;
    readonly fytShearKsi: number;
    readonly fyFrictionKsi: number;
  };
  readonly shear: {
    /** alpha_c; netAxialKip below 0 is tension */
    readonly concreteFactor: (heightOverLength: number, netAxialKip: number, grossAreaIn2: number) => number;
    /** times sqrt(f'c) Acv */
    readonly limitFactor: number;
  };
  readonly lowShearSteel: (smallBar: boolean) => { readonly vertical: number; readonly horizontal: number };
  readonly highShearSteel: (
    heightOverLength: number,
    horizontalProvided: number,
    horizontalForStrength: number,
  ) => { readonly vertical: number; readonly horizontal: number };
  readonly friction: {
    readonly coefficient: (surface: JointSurface, lambda: number) => number;
    /** upper limit of Vn over Ac in ksi */
    readonly limitKsi: (surface: JointSurface, lambda: number, fcPsi: number) => number;
  };
  readonly development: {
    readonly gradeFactor: (fyKsi: number) => number;
    readonly sizeFactor: (diameterIn: number) => number;
    /** hooked bar in tension, before the least lengths; in */
    readonly hookIn: (diameterIn: number, fyKsi: number, fcPsi: number, lambda: number) => number;
  };
  /** steel over concrete of a zone above which bars needed in compression must be tied */
  readonly tiesAboveRatio: number;
  readonly clauses: Readonly<Record<ClauseKey, string>>;
}

export type ClauseKey =
  | 'flexure'
  | 'shear'
  | 'shear-limit'
  | 'low-shear'
  | 'high-shear'
  | 'spacing-vertical'
  | 'spacing-horizontal'
  | 'curtains'
  | 'thickness'
  | 'axial'
  | 'ties'
  | 'tie-spacing'
  | 'joint'
  | 'fit'
  | 'splice';
