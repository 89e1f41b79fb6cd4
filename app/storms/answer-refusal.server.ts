import { data } from "react-router";
import { StormRefusal, WHOLE_FORM, type FormErrorsByField } from "./refusal";

/** Runs an action; a refusal becomes an answer 400 that the form shows, anything else goes on its way. */
export async function answerRefusal<T>(work: () => Promise<T>) {
  try {
    return await work();
  } catch (error) {
    if (!(error instanceof StormRefusal)) throw error;
    const errors: FormErrorsByField = { [error.field ?? WHOLE_FORM]: error.messages };
    return data({ errors }, { status: 400 });
  }
}
