export const WORKBENCH_PANELS = ['bore', 'holes', 'notes', 'air'] as const;
export type WorkbenchPanel = (typeof WORKBENCH_PANELS)[number];

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
  account: () => '/account',
  workshopDefaults: () => '/workshop/defaults',
  workshopMembers: () => '/workshop/members',
} as const;

/** Patterns for the router, with its `:parameters`. */
export const patterns = {
  design: '/designs/:id',
  workbench: '/designs/:id/r/:rev/:panel',
} as const;

export function isWorkbenchPanel(text: string | null | undefined): text is WorkbenchPanel {
  return WORKBENCH_PANELS.some((panel) => panel === text);
}
