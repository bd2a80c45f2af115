import type { HazardousMaterial } from '../api/vocabulary.ts';
import { isHazardous } from '../cutting/material-family.ts';
import { commonPractice, findingOf, type Rule } from './rule.ts';

interface Hazard {
  readonly sentence: string;
  readonly advice: string;
  readonly source: string;
  readonly figures?: readonly { name: string; value: number; unit: string }[];
}

const hazards: Readonly<Record<HazardousMaterial, Hazard>> = {
  pvc: {
    sentence:
      'PVC and other chlorinated plastics give off hydrogen chloride when the bit heats them: 5 ppm in the air is the most that may be reached at any moment, and a shop has no means to tell.',
    advice: 'Cut acrylic, HDPE or plywood in its place.',
    // S2: the ceiling as seen in a secondary copy.
    source: 'OSHA, permissible exposure limit of hydrogen chloride: ceiling 5 ppm',
    figures: [{ name: 'ceiling of hydrogen chloride', value: 5, unit: 'ppm' }],
  },
  'treated-timber': {
    sentence:
      'Treated timber carries copper, and older pieces arsenic and chromium: its dust is poisonous, and so is the smoke of a bit that burns.',
    advice:
      'Cut untreated timber. Never use treated timber for food, trays for food or things for children, and never burn the offcuts.',
    // S2
    source: 'EPA consumer sheet on timber treated with CCA, copper azole or ACQ',
  },
  'carbon-fibre': {
    sentence:
      'Carbon-fibre composites give a fine dust that irritates, can be breathed in deeply, and conducts: it can short the spindle and the electronics of the machine.',
    advice: 'Leave it to a shop with wet cutting and filtered extraction.',
    source: 'handling guides for composites, no single published source',
  },
  'unknown-plastic': {
    sentence: 'Nobody knows what this plastic is: it may be PVC, which gives off hydrogen chloride.',
    advice: 'Find out what it is from its seller, and record it by that name; without that, do not cut it.',
    source: commonPractice,
  },
  'unknown-foam': {
    sentence:
      'Nobody knows what this foam is: it may give off poisonous fumes and its dust catches fire easily.',
    advice: 'Find out what it is from its seller; without that, do not cut it.',
    source: commonPractice,
  },
};

/** Stock that must not be cut, whatever the settings. */
export const hazardousMaterial: Rule = {
  id: 'hazardous-material',
  title: 'Hazardous material',
  source: commonPractice,
  check: ({ materialId }) => {
    if (!isHazardous(materialId)) return [];
    const { sentence, advice, source, figures = [] } = hazards[materialId];
    return [
      findingOf(hazardousMaterial, { level: 'do-not-cut', sentence, advice, source, figures: [...figures] }),
    ];
  },
};
