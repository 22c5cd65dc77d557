export const WORKBENCH_PANELS = ['bore', 'holes', 'notes', 'air'] as const;
export type WorkbenchPanel = (typeof WORKBENCH_PANELS)[number];

/** Ways of looking at two instruments over each other. */
export const COMPARE_VIEWS = ['holes', 'bore', 'notes', 'pitch', 'air'] as const;
export type CompareView = (typeof COMPARE_VIEWS)[number];

/** Every address of the program, by name. Route patterns and links are both made here, so that they cannot part ways. */
export const paths = {
  home: () => '/',
  signIn: (backTo?: string) =>
    backTo === undefined || backTo === '/' ? '/sign-in' : `/sign-in?back=${encodeURIComponent(backTo)}`,
  start: () => '/start',
  today: () => '/today',
  designs: () => '/designs',
  newDesign: () => '/designs/new',
  design: (id: number) => `/designs/${id}`,
  workbench: (id: number, revision: number, panel: WorkbenchPanel) => `/designs/${id}/r/${revision}/${panel}`,
  /** Two designs, the older first; the same twice is one design beside itself at another pitch or temperature. */
  compare: (a: number, b: number, view: CompareView = 'holes') => `/designs/compare/${a}/${b}/${view}`,
  /** The rack, to choose from it what a design is to be held against; without one, both. */
  chooseToCompare: (id?: number) => `/designs?compare=${id ?? 'two'}`,
  account: () => '/account',
  workshopDefaults: () => '/workshop/defaults',
  workshopMembers: () => '/workshop/members',
} as const;

/** Patterns for the router, with its `:parameters`. */
export const patterns = {
  design: '/designs/:id',
  workbench: '/designs/:id/r/:rev/:panel',
  compare: '/designs/compare/:a/:b/:view',
} as const;

export function isWorkbenchPanel(text: string | null | undefined): text is WorkbenchPanel {
  return WORKBENCH_PANELS.some((panel) => panel === text);
}

export function isCompareView(text: string | undefined): text is CompareView {
  return COMPARE_VIEWS.some((view) => view === text);
}
