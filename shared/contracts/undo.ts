/** POST /api/buildings/:id/undo: the person's own last edit is taken back as a new edit. */
export interface UndoAnswer {
  readonly seq: number;
  /** seq of the edit that was taken back */
  readonly undone: number;
  /** what the edit had touched: names of tables, `schedule`, `settings`, `acknowledgments` */
  readonly targets: readonly string[];
}
