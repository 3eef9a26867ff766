/**
 * Keeps the last answer for each object, for as long as what else it was made from is the same. An edit leaves what it
 * does not touch the same object, so a drag works out anew only what moved. For objects that are never changed in place.
 */
export function kept<K extends object, D extends readonly unknown[], V>(make: (key: K, ...from: D) => V) {
  const last = new WeakMap<K, { readonly from: D; readonly value: V }>();
  return (key: K, ...from: D): V => {
    const known = last.get(key);
    if (known && from.every((each, i) => each === known.from[i])) return known.value;
    const value = make(key, ...from);
    last.set(key, { from, value });
    return value;
  };
}
