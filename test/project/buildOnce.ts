import { execFileSync } from "node:child_process";
import { existsSync, readdirSync, statSync } from "node:fs";
import { join } from "node:path";
import { root } from "./sourceFiles";

/** Time of the newest file under a folder. */
function newest(folder: string): number {
  const full = join(root, folder);
  if (!existsSync(full)) return 0;
  const names = readdirSync(full, { recursive: true, encoding: "utf8" });
  return Math.max(0, ...names.map((name) => statSync(join(full, name)).mtimeMs));
}

/** Builds dist/ when a source is newer, so that tests of the built package never see an old one. */
export default function buildOnce(): void {
  const marker = join(root, "dist/kernel/index.js");
  const built = existsSync(marker) ? statSync(marker).mtimeMs : 0;
  if (Math.max(newest("src"), newest("kernel")) <= built) return;
  execFileSync("npm", ["run", "build"], { cwd: root, stdio: ["ignore", "ignore", "inherit"] });
}
