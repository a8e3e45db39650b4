import type { UnitSystem } from '#shared/engineering/input';

/** What the notation means, in one line. */
export const scheduleLegend: Readonly<Record<UnitSystem, string>> = {
  us: '#5@12 EF: No. 5 at 12 in, each face, 2 curtains; without EF 1 curtain.   (8)#9: eight No. 9 in each end zone.   #4@4, 7 legs: No. 4 ties at 4 in, 7 legs through the thickness, 2 along.   none: deliberately none.   –: does not apply.',
  si: '16@200 EF: No. 16 at 200 mm, each face, 2 curtains; without EF 1 curtain.   8-25: eight No. 25 in each end zone.   13@100, 7 legs: No. 13 ties at 100 mm, 7 legs through the thickness, 2 along.   none: deliberately none.   –: does not apply.',
};
