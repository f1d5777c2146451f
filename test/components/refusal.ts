import { DesignInputError } from "../../src/base/errors";

/** The codes and paths of the issues with which a call is refused, such as "above-critical pressure". */
export function refusalOf(call: () => unknown): string[] {
  try {
    call();
  } catch (error) {
    if (error instanceof DesignInputError) return error.issues.map(({ code, path }) => `${code} ${path}`);
    throw error;
  }
  return ["answered"];
}

/** The message of the refusal of a call. */
export function messageOf(call: () => unknown): string {
  try {
    call();
  } catch (error) {
    return (error as Error).message;
  }
  return "answered";
}
