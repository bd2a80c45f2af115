import { describe, expect, it } from 'vitest';
import type { DecisionAction } from '#shared/api/vocabulary.ts';
import { availabilityOf, type DecisionFact, hazardsSettled, withholdingOf } from './availability.ts';

const decision = (action: DecisionAction, day: number, cutId?: string, revisionId = 'r1'): DecisionFact => ({
  action,
  reason: `${action} on day ${day}`,
  decidedAt: `2026-11-${String(day).padStart(2, '0')}T10:00:00.000Z`,
  // One flag for each thing that is spoken of.
  flagId: `flag on ${cutId ?? revisionId}`,
  revisionId,
  cutId,
});

describe('what may be handed out', () => {
  it('is everything while nothing was decided', () => {
    const availability = availabilityOf([]);
    expect(withholdingOf(availability, 'r1')).toBeNull();
    expect(availability.settings.size).toBe(0);
  });

  it('leaves other revisions out of a withheld revision’s way, but none out of a withheld design’s', () => {
    expect(withholdingOf(availabilityOf([decision('withholdRevision', 1)]), 'r2')).toBeNull();
    expect(withholdingOf(availabilityOf([decision('withholdRevision', 1)]), 'r1')).not.toBeNull();
    expect(withholdingOf(availabilityOf([decision('withholdDesign', 1)]), 'r2')).not.toBeNull();
  });

  it('comes back with a restoration on the same revision or record, and only then', () => {
    const withheld = [decision('withholdRevision', 1), decision('withholdSettings', 2, 'c1')];
    const other = availabilityOf([...withheld, decision('restore', 3, 'c2', 'r2')]);
    expect(withholdingOf(other, 'r1')).not.toBeNull();
    expect(other.settings.has('c1')).toBe(true);
    const record = availabilityOf([...withheld, decision('restore', 3, 'c1')]);
    expect(record.settings.has('c1')).toBe(false);
    expect(withholdingOf(record, 'r1')).not.toBeNull();
    const revision = availabilityOf([...withheld, decision('restore', 3)]);
    expect(withholdingOf(revision, 'r1')).toBeNull();
    expect(revision.settings.has('c1')).toBe(true);
  });

  it('stays withheld as a design when a flag on a record that did not withhold it is restored', () => {
    const decisions = [
      decision('withholdDesign', 1),
      decision('withholdSettings', 2, 'c1'),
      decision('restore', 3, 'c1'),
    ];
    expect(availabilityOf(decisions).design).toEqual({ reason: 'withholdDesign on day 1' });
  });

  it('stays withheld as a design when another flag on a revision is restored', () => {
    const decisions = [
      decision('withholdDesign', 1, undefined, 'r1'),
      decision('withholdRevision', 2, undefined, 'r2'),
      decision('restore', 3, undefined, 'r2'),
    ];
    expect(availabilityOf(decisions).design).toEqual({ reason: 'withholdDesign on day 1' });
    expect(availabilityOf(decisions).revisions.has('r2')).toBe(false);
    expect(availabilityOf([...decisions, decision('restore', 4)]).design).toBeNull();
  });

  it('comes back as a revision with a restoration on it, whichever flag withheld it', () => {
    const decisions = [decision('withholdRevision', 1, 'c1'), decision('restore', 2)];
    expect(availabilityOf(decisions).revisions.size).toBe(0);
    expect(availabilityOf(decisions).settings.has('c1')).toBe(true);
  });

  it('follows the latest decision', () => {
    const again = [decision('withholdDesign', 1), decision('restore', 2), decision('withholdDesign', 3)];
    expect(availabilityOf(again).design).toEqual({ reason: 'withholdDesign on day 3' });
  });
});

describe('settings with a finding that no moderator decided on', () => {
  const finding = { cutId: 'c1', sentence: 'The chip load is 0.4 mm.' };

  it('are kept back and say what they wait for, and nothing else is', () => {
    const availability = availabilityOf([], [finding]);
    expect(availability.settings.get('c1')?.reason).toBe('waits for a moderator: The chip load is 0.4 mm.');
    expect(availability.waiting.has('c1')).toBe(true);
    expect(withholdingOf(availability, 'r1')).toBeNull();
    expect(hazardsSettled(availability, 'c1')).toBe(false);
  });

  it('give a moderator’s own reason where there is one', () => {
    const availability = availabilityOf([decision('withholdSettings', 1, 'c1')], [finding]);
    expect(availability.settings.get('c1')?.reason).toBe('withholdSettings on day 1');
    expect(availability.waiting.size).toBe(0);
  });

  it('wait on when another flag on the record was restored', () => {
    const decisions = [decision('withholdSettings', 1, 'c1'), decision('restore', 2, 'c1')];
    expect(availabilityOf(decisions, [finding]).settings.has('c1')).toBe(true);
    expect(availabilityOf(decisions).settings.has('c1')).toBe(false);
  });
});

describe('a revision or design withheld for a record', () => {
  it.each(['withholdRevision', 'withholdDesign'] as const)(
    '%s keeps the settings of that record back too',
    (action) => {
      const withheld = [decision(action, 1, 'c1')];
      expect(availabilityOf(withheld).settings.has('c1')).toBe(true);
      expect(availabilityOf([...withheld, decision('restore', 2, 'c1')]).settings.has('c1')).toBe(false);
    },
  );
});

describe('hazards of a record', () => {
  it('are settled by a decision on that record, not by one on another or on the revision', () => {
    expect(hazardsSettled(availabilityOf([decision('dismiss', 2, 'c1')]), 'c1')).toBe(true);
    expect(hazardsSettled(availabilityOf([decision('dismiss', 2, 'c2')]), 'c1')).toBe(false);
    expect(hazardsSettled(availabilityOf([decision('dismiss', 2)]), 'c1')).toBe(false);
  });

  it('are open while their own flag is, whatever else was decided on the record', () => {
    const open = availabilityOf([decision('dismiss', 2, 'c1')], [], new Set(['c1']));
    expect(hazardsSettled(open, 'c1')).toBe(false);
    expect(open.openHazards.has('c1')).toBe(true);
  });
});
