/** One output in several representations, by media type; text and markup as strings, JSON types as objects. */
export type MimeBundle = Readonly<Record<string, unknown>>;

/** A textual representation; empty when there is none. */
export function bundleText(bundle: MimeBundle, type: string): string {
  const text = bundle[type];
  return typeof text === "string" ? text : "";
}

/** What a cell gives out while it runs. */
export type CellOutput =
  | { readonly type: "stream"; readonly name: "stdout" | "stderr"; readonly text: string }
  | { readonly type: "display"; readonly data: MimeBundle };

/** An error as notebooks store it. */
export interface CellError {
  readonly ename: string;
  readonly evalue: string;
  readonly traceback: readonly string[];
}

/** How a cell ended, with the representation of its last expression. */
export type CellOutcome =
  { readonly status: "ok"; readonly bundle?: MimeBundle } | ({ readonly status: "error" } & CellError);

/** A top-level variable of a cell: how it is declared, its type as written, its value as written. */
export interface Declaration {
  readonly keyword: "const" | "let" | "var";
  readonly name: string;
  readonly type?: string;
  readonly value?: string;
}
