/** A small fixed generator (Park and Miller, minimal standard): every run measures the same data. */
export function seededRandom(seed: number) {
  let state = seed;
  const next = () => {
    state = (state * 48_271) % 2_147_483_647;
    return state / 2_147_483_647;
  };
  return {
    next,
    below: (most: number) => Math.floor(next() * most),
    pick: <Item>(items: readonly Item[]): Item => {
      const item = items[Math.floor(next() * items.length)];
      if (item === undefined) throw new Error('nothing to pick from');
      return item;
    },
  };
}
export type SeededRandom = ReturnType<typeof seededRandom>;
