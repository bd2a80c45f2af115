import { z } from 'zod';

/** Control characters are never part of words a person typed on purpose. */
// biome-ignore lint/suspicious/noControlCharactersInRegex: they are what is refused
const controlCharacters = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f]/;

/** One line or paragraph of words, trimmed, of at most `most` characters. */
export const words = (most: number, what: string) =>
  z
    .string({ error: `${what} must be text` })
    .trim()
    .min(1, `${what} must not be empty`)
    .max(most, `${what} must be at most ${most} characters`)
    .refine((text) => !controlCharacters.test(text), `${what} must not contain control characters`);

/** Words that may be left empty. */
export const optionalWords = (most: number, what: string) =>
  z
    .string({ error: `${what} must be text` })
    .trim()
    .max(most, `${what} must be at most ${most} characters`)
    .refine((text) => !controlCharacters.test(text), `${what} must not contain control characters`);

/** A number above zero and at most `most`, with a sentence that names the quantity and its unit. */
export const above0 = (most: number, what: string, unit: string) =>
  z
    .number({ error: `${what} must be a number in ${unit}` })
    .positive(`${what} must be more than 0 ${unit}`)
    .max(most, `${what} must be at most ${most} ${unit}`);

/** A number from 0 to `most`, with a sentence that names the quantity and its unit. */
export const from0 = (most: number, what: string, unit: string) =>
  z
    .number({ error: `${what} must be a number in ${unit}` })
    .min(0, `${what} must not be negative`)
    .max(most, `${what} must be at most ${most} ${unit}`);

export const wholeNumber = (least: number, most: number, what: string) =>
  z
    .number({ error: `${what} must be a whole number` })
    .int(`${what} must be a whole number`)
    .min(least, `${what} must be at least ${least}`)
    .max(most, `${what} must be at most ${most}`);

export const id = z.uuid('this is not an id');
export const version = z.number().int().min(1);
export const timestamp = z.iso.datetime();

/** The query and path parts arrive as text; numbers are read from it strictly. */
export const numberText = (what: string) =>
  z
    .string()
    .regex(/^-?\d+(\.\d+)?$/, `${what} must be a number`)
    .transform(Number);

export const listOf = <Item extends z.ZodType>(item: Item) =>
  z.object({ items: z.array(item), total: z.number().int(), nextCursor: z.string().nullable() });
