/** Leaves of an opened revision, in the order they stand in the head. */
export const leaves = ['sizes', 'route', 'capacity', 'sign-off'] as const;
export type Leaf = (typeof leaves)[number];

/** Every address of the pages, written once. */
export const paths = {
  signIn: (to?: string) => (to && to !== '/' ? `/sign-in?to=${encodeURIComponent(to)}` : '/sign-in'),
  drawings: (shop: string) => `/shops/${shop}/drawings`,
  startDrawing: (shop: string, like?: { drawing: string; revision: string }) =>
    `/shops/${shop}/drawings/new${like ? `?like=${like.drawing}/${like.revision}` : ''}`,
  revision: (shop: string, drawing: string, revision: string, leaf: Leaf = 'sizes') =>
    `/shops/${shop}/drawings/${drawing}/${revision}/${leaf}`,
  printSheet: (shop: string, drawing: string, revision: string) =>
    `/shops/${shop}/drawings/${drawing}/${revision}/print`,
} as const;

/** Every address of the server that the pages ask. */
export const api = {
  health: '/api/health',
  session: '/api/session',
  everywhere: '/api/session/everywhere',
  register: (shop: string) => `/api/shops/${shop}/register`,
  drawings: (shop: string) => `/api/shops/${shop}/drawings`,
  drawing: (shop: string, drawing: string) => `/api/shops/${shop}/drawings/${drawing}`,
  revisions: (shop: string, drawing: string) => `/api/shops/${shop}/drawings/${drawing}/revisions`,
  revision: (shop: string, drawing: string, revision: string) =>
    `/api/shops/${shop}/drawings/${drawing}/revisions/${revision}`,
  act: (shop: string, drawing: string, revision: string, act: string) =>
    `/api/shops/${shop}/drawings/${drawing}/revisions/${revision}/${act}`,
  sheetSvg: (shop: string, drawing: string, revision: string) =>
    `/api/shops/${shop}/drawings/${drawing}/revisions/${revision}/sheet.svg`,
  sheetPdf: (shop: string, drawing: string, revision: string, card: boolean) =>
    `/api/shops/${shop}/drawings/${drawing}/revisions/${revision}/sheet.pdf${card ? '?card=true' : ''}`,
} as const;
