/** Whether a text from an address can be a slug. */
export const isSlug = (text: string): boolean => /^[a-z0-9-]{1,80}$/.test(text);

/** A title as it stands in an address: plain letters, digits and hyphens, at most 60 of them. */
export function slugOf(title: string): string {
  const plain = title
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .toLowerCase()
    .replace(/[^a-z0-9]+/g, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
    .replace(/-+$/, '');
  return plain === '' ? 'design' : plain;
}
