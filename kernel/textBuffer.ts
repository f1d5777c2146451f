type StreamName = "stdout" | "stderr";

/** Takes one piece of printed text for the cell that printed it. */
export type TextSink<Cell> = (name: StreamName, text: string, cell: Cell) => void;

const mostTogether = 64 * 1024; // characters sent as one piece
const longestWait = 50; // ms until the event loop sends what has gathered
const longestBusyWait = 200; // ms of a loop that never lets the timer fire

/** Joins many small writes into few pieces, and cuts what one cell prints. */
export interface TextBuffer<Cell> {
  readonly write: (name: StreamName, text: string, cell: Cell) => void;
  readonly flush: () => void;
  /** Starts counting anew for the next cell. */
  readonly startCell: () => void;
}

interface Gathered<Cell> {
  readonly name: StreamName;
  readonly cell: Cell;
  readonly parts: string[];
  readonly since: number;
  readonly timer: NodeJS.Timeout;
  length: number;
}

/** A buffer that hands its pieces to `sink` and lets a cell print at most `mostPerCell` characters. */
export function createTextBuffer<Cell>(
  sink: TextSink<Cell>,
  mostPerCell = 8 * 1024 * 1024,
): TextBuffer<Cell> {
  let gathered: Gathered<Cell> | undefined;
  let printed = 0;

  function flush(): void {
    if (gathered === undefined) return;
    const { name, parts, cell, timer } = gathered;
    gathered = undefined;
    clearTimeout(timer);
    sink(name, parts.join(""), cell);
  }

  function gather(name: StreamName, text: string, cell: Cell): void {
    if (gathered !== undefined && (gathered.name !== name || gathered.cell !== cell)) flush();
    const timer = gathered?.timer ?? setTimeout(flush, longestWait);
    gathered ??= { name, cell, parts: [], since: Date.now(), timer, length: 0 };
    gathered.parts.push(text);
    gathered.length += text.length;
    if (gathered.length > mostTogether || Date.now() - gathered.since > longestBusyWait) flush();
  }

  return {
    flush,
    startCell: () => {
      flush();
      printed = 0;
    },
    write: (name, text, cell) => {
      if (text === "" || printed > mostPerCell) return;
      const left = mostPerCell - printed;
      printed += text.length;
      const note = `\n[the rest is cut: a cell may print ${mostPerCell} characters]\n`;
      gather(name, printed > mostPerCell ? text.slice(0, left) + note : text, cell);
    },
  };
}

/** Sends what the process writes to its standard streams into a buffer, on account of `cell()`. */
export function captureStreams<Cell>(buffer: TextBuffer<Cell>, cell: () => Cell): void {
  for (const name of ["stdout", "stderr"] as const) {
    process[name].write = (chunk: string | Uint8Array, encoding?: unknown, done?: unknown): boolean => {
      buffer.write(name, typeof chunk === "string" ? chunk : Buffer.from(chunk).toString("utf8"), cell());
      const callback = typeof encoding === "function" ? encoding : done;
      if (typeof callback === "function") process.nextTick(callback);
      return true;
    };
  }
}
