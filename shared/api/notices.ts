import { z } from 'zod';
import { id, listOf, timestamp } from './primitives.ts';

/** Something a member should know: about their design, their flag, or what they took. */
export const notice = z.object({
  id,
  /** 'flag-raised', 'flag-decided', 'withheld', 'restored', 'cut-recorded', 'remixed' */
  kind: z.string(),
  sentence: z.string(),
  designSlug: z.string().optional(),
  createdAt: timestamp,
  readAt: timestamp.optional(),
});
export type Notice = z.infer<typeof notice>;
export const noticeList = listOf(notice).extend({ unread: z.number().int() });
export type NoticeList = z.infer<typeof noticeList>;
