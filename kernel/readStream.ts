import type { Feed } from "../src/balance/feed";
import { csvStream } from "./feeds/csvStream";
import { readFeedFile } from "./feeds/feedFile";
import { jsonStream } from "./feeds/jsonFeeds";

/**
 * Reads a feed from a file that a person can type, and works it out as `feed` does.
 *
 * A CSV file has a table of components, and what holds for all of them in lines above it:
 *
 *   # name: aromatics, base case
 *   # temperature: 95 degC
 *   # pressure: 2.0 bar
 *   component,mass flow [kg/h]
 *   benzene,1450
 *   toluene,8900
 *
 * The second column is `mass flow [..]`, `molar flow [..]`, `mole fraction` or `mass fraction` (a fraction also in
 * percent: `mass fraction [wt%]`); with fractions a line `# flow: 120 kmol/h` or `# flow: 14.2 t/h` says how much.
 * Further lines: `q`, `vapor fraction`, `normalize: yes`; `note`, `source`, `date` are for people. Comma, semicolon
 * and tab separate; the decimal mark is a point. A JSON file is one object with the fields of `feed`.
 *
 * @param path - the file, from the notebook's folder
 * @returns the feed, as of `feed`
 * @throws DesignInputError with all faults of the file, each with its line and column
 *
 * Source: own format; computed as `feed`.
 * @example readStream("notebooks/feeds/mixed-aromatics.csv").kind // "feed"
 */
export function readStream(path: string): Feed {
  return readFeedFile(path, { json: jsonStream, csv: csvStream }, () => "")[0]!;
}
