export * from "../src/index";

// Notebook functions: the only ones that read files or show things
export { displayUnits } from "./displayUnits";
export { readCases } from "./readCases";
export { readStream } from "./readStream";
export { show } from "./show";
export {
  equilibriumDiagram,
  mccabeThieleDiagram,
  temperatureCompositionDiagram,
  volatilityDiagram,
} from "./figures/inDisplayUnits";
