/** Build step: removes from dist what is left of files that have been renamed or deleted. */
import * as fs from "node:fs";
import * as path from "node:path";
import { ownPackage } from "../packageRoot";

const compiled = /(\.js|\.d\.ts)$/;

function removeStale(folder: string): void {
  const built = path.join(ownPackage(), "dist", folder);
  for (const name of fs.readdirSync(built, { recursive: true, encoding: "utf8" })) {
    const source = path.join(ownPackage(), folder, name.replace(compiled, ".ts"));
    const isStale = (compiled.test(name) || name.endsWith(".json")) && !fs.existsSync(source);
    if (isStale) fs.rmSync(path.join(built, name));
  }
}

["src", "kernel"].forEach(removeStale);
