/**
 * How much one drawing may ask of the program (computation.md §1).
 * The reader keeps the first five itself; time and memory are kept by the worker that runs it.
 */
export const DRAWING_LIMITS = {
  /** Size of the file in bytes (UTF-8): 10 MB. */
  fileBytes: 10 * 1024 * 1024,
  /** Segments after `use` is expanded. */
  segments: 200_000,
  /** Levels of nesting, the root being the first; also levels after `use` is expanded. */
  levels: 64,
  /** Coordinates in page millimetres lie within plus and minus this. */
  coordinateMm: 1e6,
  /** Elements drawn after `use` is expanded: stops copies of copies that hold no segments. */
  elementsDrawn: 200_000,
  /** Seconds for one drawing, kept by the worker. */
  timeS: 10,
  /** Memory for one drawing in MB, kept by the worker. */
  memoryMb: 512,
} as const;

/** Lists that come out of a file are cut at these lengths, so that an answer stays readable. */
export const REPORT_LIMITS = {
  layerNameCharacters: 80,
  detailCharacters: 60,
  /** Separate warnings of one code, each with its own place; the rest are counted. */
  warningsPerCode: 20,
} as const;

/**
 * Length of a text in UTF-8 bytes as far as needed to tell whether it passes `limit`: it may come out
 * short for a text that cannot pass it, and stops where it does.
 * Lone surrogates count as the three bytes that an encoder would write for them.
 */
export function utf8Bytes(text: string, limit: number): number {
  if (text.length > limit || text.length * 3 <= limit) return text.length;
  let bytes = text.length;
  for (let i = 0; i < text.length && bytes <= limit; i++) {
    const code = text.charCodeAt(i);
    if (code < 0x80) continue;
    bytes += code < 0x800 || (code >= 0xd800 && code <= 0xdfff) ? 1 : 2;
  }
  return bytes;
}
