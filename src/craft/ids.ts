/** A free id made from a name: "Tail thruster" → tail-thruster, or tail-thruster-2 when that is taken. */
export function freeId(name: string, taken: Readonly<Record<string, unknown>>): string {
  const plain = name
    .normalize('NFKD')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^[^a-z]+|-+$/g, '')
    .slice(0, 40);
  const base = plain || 'part';
  for (let n = 1; ; n++) {
    const id = n === 1 ? base : `${base}-${n}`;
    if (!Object.hasOwn(taken, id)) return id;
  }
}
