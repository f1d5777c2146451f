export * from "../src/index";

// Notebook functions: the only ones that read files or show things
export { displayUnits } from "./displayUnits";
export { show } from "./show";
