import type { Split } from "../balance/split";
import { type ShortcutWorkspace, sharedShortcutWorkspace } from "./shortcutWorkspace";

/** Puts a checked split into the shared scratch memory, components in the order of falling volatility. */
export function loadSplit(split: Split): ShortcutWorkspace {
  const { volatility, fractions, lightKey, heavyKey } = split;
  const w = sharedShortcutWorkspace(volatility.length);
  const { order, volatility: sorted } = w;
  w.count = volatility.length;
  for (let i = 0; i < volatility.length; i++) {
    const alpha = volatility[i]!;
    let place = i;
    for (; place > 0 && sorted[place - 1]! < alpha; place--) {
      sorted[place] = sorted[place - 1]!;
      order[place] = order[place - 1]!;
    }
    sorted[place] = alpha;
    order[place] = i;
  }
  for (let place = 0; place < volatility.length; place++) {
    const i = order[place]!;
    w.fraction[place] = fractions[i]!;
    if (i === lightKey) w.lightKey = place;
    else if (i === heavyKey) w.heavyKey = place;
  }
  w.lightKeyRecovery = split.lightKeyRecovery;
  w.heavyKeyRecovery = split.heavyKeyRecovery;
  return w;
}
