import { it } from 'vitest';
import { checkSettings } from '#shared/rules/rules.ts';
import { cuts } from './cuts.ts';
import { designs } from './designs.ts';
it('x', () => {
  for (const c of [...designs.flatMap((d) => (d.cut ? [{ design: d.key, ...d.cut }] : [])), ...cuts])
    for (const f of checkSettings(c)) console.log(c.design, c.outcome, c.materialId, f.level, f.sentence);
});
