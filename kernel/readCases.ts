import type { Feed } from "../src/balance/feed";
import { csvCases } from "./feeds/csvCases";
import { readFeedFile } from "./feeds/feedFile";
import { jsonCases } from "./feeds/jsonFeeds";

/**
 * Reads several feeds from one file, and works each out as `feed` does.
 *
 * A CSV file has a row for each case: its name, then a column for each component with its unit, and columns such as
 * `temperature [degC]`, `pressure [bar]`, `q`, `vapor fraction`, `flow [kmol/h]`:
 *
 *   case,benzene [kg/h],toluene [kg/h],temperature [degC],pressure [bar]
 *   base,1450,8900,95,2.0
 *   summer,1600,9200,102,2.0
 *
 * Amounts are flows, or fractions as `[mole fraction]`, `[mol%]`, `[mass fraction]`, `[wt%]`; an empty cell leaves its
 * component out. Lines such as `# pressure: 2.0 bar` hold for all cases. A JSON file is a list of objects with the
 * fields of `feed`.
 *
 * @param path - the file, from the notebook's folder
 * @returns the feeds in the order of the file, each with the name of its case
 * @throws DesignInputError with all faults of the file, each with its line and column
 *
 * Source: own format; computed as `feed`.
 * @example readCases("test/data/cases.csv").map(({ name }) => name) // ["base", "summer"]
 */
export function readCases(path: string): Feed[] {
  return readFeedFile(path, { json: jsonCases, csv: csvCases }, (i) => `cases[${i}].`);
}
