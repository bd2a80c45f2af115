import { z } from 'zod';

/** Control characters, noncharacters and halves of surrogate pairs are never part of words typed on purpose. */
const noText = /[\p{Cc}\p{Cs}\p{Cn}]/u;
/** What turns the direction of writing could make a line read as another. */
const turnsWriting = /[\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069]/;

const isPlain = (text: string, lineBreaks: boolean) =>
  !noText.test(lineBreaks ? text.replace(/[\n\t]/g, ' ') : text) && !turnsWriting.test(text);

const text = (what: string) =>
  z.string({ error: `${what} must be text` }).overwrite((given) => given.replace(/\r\n?/g, '\n').trim());

/** One line of words, trimmed, of at most `most` characters. */
export const words = (most: number, what: string) =>
  text(what)
    .min(1, `${what} must not be empty`)
    .max(most, `${what} must be at most ${most} characters`)
    .refine((given) => isPlain(given, false), `${what} must be one line without control characters`);

/** Words in several lines that may be left empty. */
export const optionalWords = (most: number, what: string) =>
  text(what)
    .max(most, `${what} must be at most ${most} characters`)
    .refine((given) => isPlain(given, true), `${what} must not contain control characters`);

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
