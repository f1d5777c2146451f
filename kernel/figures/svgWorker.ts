/** Thread that draws still pictures: plotly.js in jsdom, a plot in, SVG text out. Texts are measured by textWidth. */
import { JSDOM } from "jsdom";
import { type MessagePort, workerData } from "node:worker_threads";
import { innerBox, outerBox } from "./elementBox";
import { pathLength, pointAtLength } from "./pathLength";
import { readPlotlySource } from "./plotlySource";
import type { Plot } from "./svg";
import { type SvgElement, textBox } from "./textBox";

interface PlotlyLibrary {
  toImage(figure: object, options: object): Promise<string>;
}

const identity: object = { a: 1, b: 0, c: 0, d: 1, e: 0, f: 0, inverse: () => identity };

/** What jsdom lacks: layout, canvases, object URLs. */
function addMeasuring(window: JSDOM["window"]): void {
  const prototype = window.SVGElement.prototype as unknown as Record<string, unknown>;
  prototype["getBBox"] = function (this: SvgElement) {
    return innerBox(this);
  };
  prototype["getBoundingClientRect"] = function (this: SvgElement) {
    const box = outerBox(this);
    return { ...box, left: box.x, top: box.y, right: box.x + box.width, bottom: box.y + box.height };
  };
  prototype["getComputedTextLength"] = function (this: SvgElement) {
    return textBox(this).width;
  };
  prototype["getTotalLength"] = function (this: SvgElement) {
    return pathLength(this.getAttribute("d") ?? "");
  };
  prototype["getPointAtLength"] = function (this: SvgElement, length: number) {
    return pointAtLength(this.getAttribute("d") ?? "", length);
  };
  prototype["getScreenCTM"] = () => identity;
  window.URL.createObjectURL = () => "";
  window.HTMLCanvasElement.prototype.getContext = () => null;
}

function loadPlotly(): { library: PlotlyLibrary; window: JSDOM["window"] } {
  const { window } = new JSDOM("<!doctype html><body></body>", {
    runScripts: "outside-only",
    pretendToBeVisual: true,
  });
  addMeasuring(window);
  window.eval(readPlotlySource());
  return { library: (window as unknown as { Plotly: PlotlyLibrary }).Plotly, window };
}

/** Numbers for the marks inside a picture, the same for the same plot: notebooks do not change without need. */
function randomFrom(text: string): () => number {
  let state = 0;
  for (let i = 0; i < text.length; i++) state = (Math.imul(state, 31) + text.charCodeAt(i)) >>> 0;
  return () => {
    state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
    return state / 2 ** 32;
  };
}

function draw({ library, window }: ReturnType<typeof loadPlotly>, text: string): Promise<string> {
  const plot = JSON.parse(text) as Plot;
  window.Math.random = randomFrom(text);
  const { width, height } = plot.layout;
  // Given a plot and not a drawn element, plotly draws it once, into an element of its own that it removes.
  const figure = { data: plot.data, layout: plot.layout, config: { staticPlot: true } };
  return library.toImage(figure, { format: "svg", width, height, imageDataOnly: true });
}

const { port, flag } = workerData as { port: MessagePort; flag: SharedArrayBuffer };
const answered = new Int32Array(flag);
const plotly = loadPlotly();

async function answer(text: string): Promise<void> {
  let reply: { svg?: string; error?: string };
  try {
    reply = { svg: await draw(plotly, text) };
  } catch (error) {
    reply = { error: String(error) };
  }
  port.postMessage(reply);
  Atomics.store(answered, 0, 1);
  Atomics.notify(answered, 0);
}

port.on("message", (text: string) => void answer(text));
