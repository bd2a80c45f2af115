import { ProblemError } from '#server/http/problem.ts';
import type { Licence } from '#shared/api/vocabulary.ts';
import { remixRefusal } from '#shared/licences/remix-refusal.ts';
import type { Ancestor } from './lineage.ts';

/**
 * Refuses a licence that the originals do not allow. Members may license their own work anew, so their own
 * originals do not bind them; the nearest one by somebody else does. Those further up need no look: what one licence
 * allows never allows more than it does itself (tested beside the table).
 */
export function requireLicence(memberId: string, ancestors: readonly Ancestor[], chosen: Licence): void {
  const binding = ancestors.find((ancestor) => ancestor.ownerId !== memberId);
  if (binding === undefined) return;
  const refusal = remixRefusal(binding.title, binding.licence, chosen);
  if (refusal === null) return;
  throw new ProblemError(403, 'licence.not-allowed', refusal, {
    errors: [{ path: 'licence', message: refusal }],
  });
}
