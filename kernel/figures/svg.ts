import * as path from "node:path";
import { type MessagePort, MessageChannel, receiveMessageOnPort, Worker } from "node:worker_threads";
import { ownPackage } from "../packageRoot";

/** What the drawing thread is sent. */
export interface Plot {
  readonly data: readonly object[];
  readonly layout: Readonly<Record<string, unknown>> & { readonly width: number; readonly height: number };
}

interface DrawingThread {
  readonly port: MessagePort;
  readonly answered: Int32Array;
}

let drawing: DrawingThread | undefined;
const longestWait = 30_000; // ms

function start(): DrawingThread {
  const flag = new SharedArrayBuffer(4);
  const { port1, port2 } = new MessageChannel();
  const file = path.join(ownPackage(), "dist", "kernel", "figures", "svgWorker.js");
  const worker = new Worker(file, {
    workerData: { port: port2, flag },
    transferList: [port2],
    stdout: true,
    stderr: true,
  });
  worker.on("error", () => undefined); // a thread that cannot draw leaves figures without a still picture
  worker.unref();
  port1.unref();
  return { port: port1, answered: new Int32Array(flag) };
}

/** Starts the drawing thread ahead of the first figure; it loads for about a second. */
export function prepareSvg(): void {
  drawing ??= start();
}

/** The picture of a plot as SVG text; undefined when it cannot be drawn. Waits for the drawing thread. */
export function figureSvg(plot: Plot): string | undefined {
  try {
    prepareSvg();
    const { port, answered } = drawing!;
    Atomics.store(answered, 0, 0);
    port.postMessage(JSON.stringify(plot));
    if (Atomics.wait(answered, 0, 0, longestWait) === "timed-out") {
      drawing = undefined;
      return undefined;
    }
    return (receiveMessageOnPort(port)?.message as { svg?: string } | undefined)?.svg;
  } catch {
    return undefined;
  }
}
