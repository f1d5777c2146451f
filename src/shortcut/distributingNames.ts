import type { ShortcutWorkspace } from "./shortcutWorkspace";

/** Components other than the keys that reach both products at minimum reflux, as the volatilities fall. */
export function distributingNames(w: ShortcutWorkspace, names: readonly string[]): string[] {
  const distributing: string[] = [];
  for (let place = 0; place < w.count; place++) {
    const c = w.classOf[place]!;
    const isKey = place === w.lightKey || place === w.heavyKey;
    if (c >= w.firstDistributing && c <= w.lastDistributing && !isKey)
      distributing.push(names[w.order[place]!]!);
  }
  return distributing;
}
