/** `npm run tables`: writes the tables of the documentation anew. */
import { writeFileSync } from "node:fs";
import { tablesFile, tablesText, withTables } from "./tables";

writeFileSync(tablesFile, withTables(tablesText()));
