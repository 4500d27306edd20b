/** What can be moved: a tie loosened, or the price of a row changed. `rate`: how the sum changes at first. */
export type Step =
  | { readonly kind: 'tie'; readonly tie: number; readonly rate: number }
  | { readonly kind: 'row'; readonly row: number; readonly sign: 1 | -1; readonly rate: number };

/** Or: the best option of a class has a share below nought, and first has to change places with this tie. */
export type Obstacle = Step | { readonly kind: 'best'; readonly tie: number };

/** Where a walk ends: an option comes to tie with the best of its class, or a price falls to zero. */
export type Stop =
  | { readonly kind: 'tie'; readonly option: number; readonly distance: number }
  | { readonly kind: 'zero'; readonly row: number; readonly distance: number };
