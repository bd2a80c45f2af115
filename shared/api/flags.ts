import { z } from 'zod';
import { finding } from './findings.ts';
import { id, listOf, timestamp, version, wholeNumber, words } from './primitives.ts';
import { decisionAction, findingLevel } from './vocabulary.ts';

const reason = words(1000, 'Reason');
export const decisionGiven = z.strictObject({ action: decisionAction, reason });

export const flagCreate = z.strictObject({
  designSlug: z.string().min(1, 'Say which design').max(100),
  /** Absent: the design's newest revision. */
  revision: wholeNumber(1, 100_000, 'Revision').optional(),
  /** The record whose settings or outcome are meant. */
  recordId: id.optional(),
  reason,
  /** A moderator may flag and decide in one step. */
  decision: decisionGiven.optional(),
});
export type FlagCreate = z.infer<typeof flagCreate>;

export const decisionCreate = z.strictObject({ action: decisionAction, reason, version });
export type DecisionCreate = z.infer<typeof decisionCreate>;

const person = z.object({ id, name: z.string() });

export const decision = z.object({
  action: decisionAction,
  reason: z.string(),
  decidedBy: person,
  decidedAt: timestamp,
});

/** Somebody's, or a rule's, call for a decision. */
export const flag = z.object({
  id,
  version,
  state: z.enum(['open', 'decided']),
  design: z.object({ slug: z.string(), title: z.string(), drawingNumber: z.string(), ownerId: id }),
  revision: z.number().int(),
  recordId: id.optional(),
  level: findingLevel,
  reason: z.string(),
  /** Absent when a rule raised it by itself. */
  raisedBy: person.optional(),
  finding: finding.optional(),
  /** How many members took the revision. */
  takeCount: z.number().int(),
  createdAt: timestamp,
  decision: decision.optional(),
});
export type Flag = z.infer<typeof flag>;
export const flagList = listOf(flag);
export const flagQuery = z.strictObject({
  state: z.enum(['open', 'decided']).optional(),
  cursor: z.string().max(500).optional(),
});

export const auditEntry = z.object({
  number: z.number().int(),
  at: timestamp,
  actorId: id.nullable(),
  action: z.string(),
  subject: z.string(),
  detail: z.record(z.string(), z.unknown()),
  hash: z.string(),
});
export const auditList = listOf(auditEntry).extend({ chainIsWhole: z.boolean() });
export type AuditList = z.infer<typeof auditList>;
export const auditQuery = z.strictObject({ cursor: z.string().max(500).optional() });
