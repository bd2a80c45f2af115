import { z } from 'zod';

// Every list of fixed codes in the contract, in one place. Codes are never renamed; more may be added.

export const bitKinds = [
  'up-cut',
  'down-cut',
  'compression',
  'straight',
  'ball-nose',
  'v-bit',
  'surfacing',
] as const;
export const bitKind = z.enum(bitKinds);
export type BitKind = z.infer<typeof bitKind>;

export const outcomes = ['clean', 'usable', 'failed'] as const;
export const outcome = z.enum(outcomes);
export type Outcome = z.infer<typeof outcome>;

export const materialFamilies = [
  'softwood',
  'hardwood',
  'plywood',
  'mdf',
  'acrylic',
  'soft-plastic',
  'aluminium',
] as const;
export const materialFamily = z.enum(materialFamilies);
export type MaterialFamily = z.infer<typeof materialFamily>;

/** Stock that must not be cut at all: recorded by its true name, so that the reason can be told. */
export const hazardousMaterials = [
  'pvc',
  'treated-timber',
  'carbon-fibre',
  'unknown-plastic',
  'unknown-foam',
] as const;
export type HazardousMaterial = (typeof hazardousMaterials)[number];

export const materials = [...materialFamilies, ...hazardousMaterials] as const;
export const material = z.enum(materials);
export type Material = z.infer<typeof material>;

export const holdDowns = ['top-clamps', 'side-clamps', 'tape', 'screws', 'vacuum', 'tabs'] as const;
export const holdDown = z.enum(holdDowns);
export type HoldDown = z.infer<typeof holdDown>;

export const standingWords = ['uncut', 'cut-once', 'proven', 'well-proven', 'disputed', 'withheld'] as const;
export const standingWord = z.enum(standingWords);
export type StandingWord = z.infer<typeof standingWord>;

export const kinds = [
  'bit-trays',
  'hold-downs',
  'jigs-and-stops',
  'gauges',
  'shop-storage',
  'dust-and-safety',
  'boxes',
  'signs-and-lettering',
  'other',
] as const;
export const kind = z.enum(kinds);
export type Kind = z.infer<typeof kind>;

/** SPDX identifiers of the licences a member may choose. */
export const licences = [
  'CC0-1.0',
  'CC-BY-4.0',
  'CC-BY-SA-4.0',
  'CC-BY-NC-4.0',
  'CC-BY-NC-SA-4.0',
  'CC-BY-ND-4.0',
  'CC-BY-NC-ND-4.0',
  'CERN-OHL-P-2.0',
  'CERN-OHL-W-2.0',
  'CERN-OHL-S-2.0',
] as const;
export const licence = z.enum(licences);
export type Licence = z.infer<typeof licence>;

export const roles = ['member', 'moderator', 'administrator'] as const;
export const role = z.enum(roles);
export type Role = z.infer<typeof role>;

export const machineClasses = ['small-desktop', 'belt-gantry', 'screw-gantry', 'floor'] as const;
export const machineClass = z.enum(machineClasses);
export type MachineClass = z.infer<typeof machineClass>;

export const fitResults = ['fits', 'fitsIf', 'doesNotFit', 'notKnown'] as const;
export const fitResult = z.enum(fitResults);
export type FitResult = z.infer<typeof fitResult>;

export const findingLevels = ['note', 'caution', 'do-not-cut'] as const;
export const findingLevel = z.enum(findingLevels);
export type FindingLevel = z.infer<typeof findingLevel>;

export const decisionActions = [
  'dismiss',
  'caution',
  'withholdSettings',
  'withholdRevision',
  'withholdDesign',
  'restore',
] as const;
export const decisionAction = z.enum(decisionActions);
export type DecisionAction = z.infer<typeof decisionAction>;

export const sorts = ['match', 'newest', 'title', 'size'] as const;
export const sort = z.enum(sorts);
export type Sort = z.infer<typeof sort>;
