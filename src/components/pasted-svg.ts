/** The SVG on a clipboard: a file, or markup as text; null when there is neither. */
export const pastedSvg = (clipboard: Pick<DataTransfer, 'files' | 'getData'> | null): File | null => {
  const [file] = clipboard?.files ?? [];
  if (file !== undefined) return file;
  const text = clipboard?.getData('text/plain').trim() ?? '';
  if (!text.startsWith('<') || !/<(?:[\w-]+:)?svg[\s>]/i.test(text)) return null;
  return new File([text], 'pasted.svg', { type: 'image/svg+xml' });
};
