/** What a form is told after it was sent: nothing typed is lost, each message stands at its field. */
export interface FormState {
  /** As typed, without passwords. */
  readonly values: Readonly<Record<string, string>>;
  /** By field name. */
  readonly problems: Readonly<Record<string, string>>;
  /** Of the whole form. */
  readonly problem?: string;
  readonly done?: boolean;
  /** Something shown this once. */
  readonly secret?: string;
}

export const emptyForm: FormState = { values: {}, problems: {} };

export type FormAction = (before: FormState, form: FormData) => Promise<FormState>;
