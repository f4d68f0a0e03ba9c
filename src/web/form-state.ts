/** What a server action tells its form: a sentence, problems by field, and what was typed, so that nothing is lost. */
export type FormState = {
  message?: string;
  problems?: Record<string, string>;
  values?: Record<string, string>;
};
