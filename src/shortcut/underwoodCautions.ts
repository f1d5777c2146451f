import type { Caution } from "../base/result";
import { vanishingFlowReflux } from "./minimumReflux";
import type { ShortcutWorkspace } from "./shortcutWorkspace";

/** Single-root values further apart than this, relative to one plus the reflux, are worth a look. */
const noticeableSpread = 0.05;

/** What is doubtful about a minimum reflux. */
export function judgeMinimumReflux(
  w: ShortcutWorkspace,
  distributing: readonly string[],
  singleRoot: readonly number[],
): Caution[] {
  const cautions: Caution[] = [];
  const least = vanishingFlowReflux(w);
  if (w.minimumReflux < least) {
    cautions.push({
      code: "flow-vanishes-first",
      severity: "check",
      kind: "method",
      message: `Underwood's minimum reflux ratio ${w.minimumReflux.toPrecision(4)} would leave a section without liquid or vapor; the column needs more than ${least.toPrecision(4)}`,
      value: w.minimumReflux,
      limit: least,
    });
  }
  const highest = Math.max(...singleRoot);
  const spread = (highest - w.minimumReflux) / (1 + Math.abs(w.minimumReflux));
  if (singleRoot.length > 1 && spread > noticeableSpread) {
    cautions.push({
      code: "components-distribute-between-keys",
      severity: "check",
      kind: "method",
      message: `${someOf(distributing)} distribute at minimum reflux; the most cautious single root asks for a reflux ratio of ${highest.toPrecision(4)}, the exact minimum is ${w.minimumReflux.toPrecision(4)}; count stages one by one near it`,
      value: highest,
      limit: w.minimumReflux,
    });
  } else if (distributing.length > 0) {
    cautions.push({
      code: "components-distribute",
      severity: "note",
      kind: "method",
      message: `${someOf(distributing)} reach both products at minimum reflux`,
      value: distributing.length,
    });
  }
  return cautions;
}

/** The first few names, and how many more there are. */
function someOf(names: readonly string[]): string {
  const shown = names.slice(0, 5).join(", ");
  return names.length > 5 ? `${shown} and ${names.length - 5} more` : shown;
}
