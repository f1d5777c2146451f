import * as fs from "node:fs";
import * as path from "node:path";

const packageName = "refluxbook";

function nameAndVersion(folder: string): { name?: unknown; version?: unknown } {
  try {
    return JSON.parse(fs.readFileSync(path.join(folder, "package.json"), "utf8")) as { name?: unknown };
  } catch {
    return {};
  }
}

/** A folder and all that hold it, innermost first. */
function outwards(folder: string): string[] {
  const parent = path.dirname(folder);
  return parent === folder ? [folder] : [folder, ...outwards(parent)];
}

function isPackage(folder: string): boolean {
  return nameAndVersion(folder).name === packageName;
}

/** The folder of the package that this file belongs to. */
export function ownPackage(): string {
  const found = outwards(fs.realpathSync(__dirname)).find(isPackage);
  if (found === undefined) throw new Error(`no package.json of ${packageName} above ${__dirname}`);
  return found;
}

/**
 * The package that a notebook's cells import: the one that holds its folder (a clone) or is installed beside or above
 * it, else the one this kernel belongs to.
 */
export function packageForNotebook(folder: string): string {
  for (const place of outwards(path.resolve(folder))) {
    for (const candidate of [place, path.join(place, "node_modules", packageName)]) {
      if (isPackage(candidate)) return fs.realpathSync(candidate);
    }
  }
  return ownPackage();
}

/** Version of the package in that folder. */
export function packageVersion(folder: string): string {
  const { version } = nameAndVersion(folder);
  return typeof version === "string" ? version : "unknown";
}
