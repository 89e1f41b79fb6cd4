/** Something a person asked for that cannot be done as asked: beside which field to say so, and what to do. */
export class StormRefusal extends Error {
  override name = "StormRefusal";
  readonly messages: string[];
  constructor(
    messages: string | string[],
    /** The form field it belongs beside; null for the form as a whole. */
    readonly field: string | null = null,
  ) {
    super([messages].flat().join(" "));
    this.messages = [messages].flat();
  }
}

/** What is wrong with a form, by field name; under `form` what belongs to none. */
export type FormErrorsByField = Partial<Record<string, string[]>>;

export const WHOLE_FORM = "form";
