/** One stage of a yard: a link on the beam. A stage that is not built has none. */
export interface Stage {
  href: string;
  label: string;
  /** For the bar on the phone, where the label is too long. */
  short?: string;
  current?: boolean;
  /** Something is still missing there: a hollow notch. */
  missing?: boolean;
}
