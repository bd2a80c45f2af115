// Choices that stay on this device. Storage can be closed (private windows, policies): a choice then
// lasts as long as the page, which is better than a page that does not open.

const prefix = 'tallyloft.';

/** The text kept under a name, or null. */
export const readKept = (name: string): string | null => {
  try {
    return localStorage.getItem(prefix + name);
  } catch {
    return null;
  }
};

/** Keeps a text under a name; null forgets it. */
export const keep = (name: string, text: string | null): void => {
  try {
    if (text === null) localStorage.removeItem(prefix + name);
    else localStorage.setItem(prefix + name, text);
  } catch {
    // See above.
  }
};
