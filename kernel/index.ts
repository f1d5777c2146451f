export * from "../src/index";
export { displayUnits } from "./displayUnits";
