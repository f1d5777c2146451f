/** The command was used wrongly, or a file it needs cannot be read. The message says what to do. */
export class UsageError extends Error {
  override readonly name: string = "UsageError";
}
