import { leastFraction, leastVolatilityGap } from "../balance/keys";
import type { ShortcutWorkspace } from "./shortcutWorkspace";

/**
 * Groups the components by volatility: absent ones are left out and equal ones added up, so that every pair of
 * neighboring classes has exactly one Underwood root between them. A class with a key has the key's volatility.
 */
export function groupByVolatility(w: ShortcutWorkspace): void {
  const { volatility, fraction, classVolatility, classFraction, classOf } = w;
  let classes = 0;
  let highest = Infinity;
  for (let i = 0; i < w.count; i++) {
    const z = fraction[i]!;
    const alpha = volatility[i]!;
    if (!(z >= leastFraction)) {
      classOf[i] = -1;
      continue;
    }
    if (classes > 0 && highest - alpha <= leastVolatilityGap * highest) {
      classFraction[classes - 1] = classFraction[classes - 1]! + z;
      if (i === w.lightKey || i === w.heavyKey) classVolatility[classes - 1] = alpha;
    } else {
      highest = alpha;
      classVolatility[classes] = alpha;
      classFraction[classes] = z;
      classes++;
    }
    classOf[i] = classes - 1;
  }
  for (let c = 0; c < classes; c++) w.classWeight[c] = classVolatility[c]! * classFraction[c]!;
  w.classes = classes;
  w.lightClass = classOf[w.lightKey]!;
  w.heavyClass = classOf[w.heavyKey]!;
}
