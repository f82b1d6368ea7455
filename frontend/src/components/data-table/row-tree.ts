/** Rows that unfold to rows beneath them. */
export interface RowTree {
  /** 1 for a row of the list, 2 for one beneath it. */
  levelAt: (index: number) => 1 | 2;
  /** Whether a row is unfolded; undefined for one that has nothing beneath it. */
  openAt: (index: number) => boolean | undefined;
  toggle: (index: number) => void;
}
