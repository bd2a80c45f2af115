import type { Design } from '#shared/api/designs.ts';
import type { MemberKey } from './club/types.ts';

interface OnShelf {
  slug: string;
  owner: MemberKey;
  /** The newest revision so far. */
  revision: number;
}

/** What the demo has published so far, by the key of its data. */
export interface Shelf {
  issued(key: string, owner: MemberKey, design: Design): void;
  of(key: string): OnShelf;
}

export function emptyShelf(): Shelf {
  const byKey = new Map<string, OnShelf>();
  return {
    issued: (key, owner, design) => {
      byKey.set(key, { slug: design.slug, owner, revision: design.revision.number });
    },
    of(key) {
      const found = byKey.get(key);
      if (found === undefined) throw new Error(`the demo speaks of ${key} before it is published`);
      return found;
    },
  };
}
