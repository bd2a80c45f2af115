import type { Finding } from '../api/findings.ts';
import { findingLevels } from '../api/vocabulary.ts';
import { chipLoad } from './chip-load.ts';
import { deeperThanStock } from './deeper-than-stock.ts';
import { depthOfCut } from './depth-of-cut.ts';
import { hazardousMaterial } from './hazardous-material.ts';
import type { Rule, SettingsContext } from './rule.ts';
import { spindleOverMark } from './spindle-over-mark.ts';

/** Every rule that looks at settings. */
export const settingsRules: readonly Rule[] = [
  hazardousMaterial,
  spindleOverMark,
  deeperThanStock,
  depthOfCut,
  chipLoad,
];

/** What the rules say of settings, gravest first. */
export function checkSettings(context: SettingsContext): Finding[] {
  const gravity = (finding: Finding) => findingLevels.indexOf(finding.level);
  return settingsRules.flatMap((rule) => rule.check(context)).sort((a, b) => gravity(b) - gravity(a));
}
