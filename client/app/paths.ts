/** Every path of the client and its builder. */
export const inputTabs = ['levels', 'walls', 'forces', 'gravity', 'combinations', 'overrides', 'settings'] as const;
export type InputTab = (typeof inputTabs)[number];

export const buildingPages = ['inputs', 'distribution', 'takedown', 'schedule'] as const;
export type BuildingPage = (typeof buildingPages)[number];

export const paths = {
  signIn: '/sign-in',
  buildings: '/buildings',
  building: (id: string) => `/buildings/${id}`,
  page: (id: string, page: BuildingPage) => `/buildings/${id}/${page}`,
  inputs: (id: string, tab: InputTab = 'levels') => `/buildings/${id}/inputs/${tab}`,
  distribution: (id: string) => `/buildings/${id}/distribution`,
  takedown: (id: string) => `/buildings/${id}/takedown`,
  schedule: (id: string) => `/buildings/${id}/schedule`,
} as const;
