/** `npm run bench`: every benchmark, one after the other, so that none disturbs another. */
import { execFileSync } from "node:child_process";
import { readdirSync } from "node:fs";
import { join } from "node:path";

for (const name of readdirSync(__dirname).sort()) {
  if (!name.endsWith(".bench.ts")) continue;
  console.log(`\n== ${name}`);
  const words = ["-T", "-P", "tsconfig.json", join(__dirname, name)];
  execFileSync(process.execPath, [require.resolve("ts-node/dist/bin"), ...words], { stdio: "inherit" });
}
