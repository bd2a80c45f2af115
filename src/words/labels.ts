import type {
  BitKind,
  FitResult,
  HoldDown,
  Kind,
  Licence,
  MachineClass,
  Material,
  MaterialFamily,
  Outcome,
  Role,
  Sort,
  StandingWord,
} from '#shared/api/vocabulary.ts';

// What the codes of the contract are called on the screen. Types only come from the contract, so that
// pages which show codes do not load the schemas; the types make sure that no code is forgotten.

export const kindLabels: Readonly<Record<Kind, string>> = {
  'bit-trays': 'Bit trays',
  'hold-downs': 'Hold-downs',
  'jigs-and-stops': 'Jigs and stops',
  gauges: 'Gauges',
  'shop-storage': 'Shop storage',
  'dust-and-safety': 'Dust and safety',
  boxes: 'Boxes',
  'signs-and-lettering': 'Signs and lettering',
  other: 'Other',
};

/** As in a sentence: "proven in MDF". */
export const familyLabels: Readonly<Record<MaterialFamily, string>> = {
  softwood: 'softwood',
  hardwood: 'hardwood',
  plywood: 'plywood',
  mdf: 'MDF',
  acrylic: 'acrylic',
  'soft-plastic': 'soft plastic',
  aluminium: 'aluminium',
};

/** Families, and what must not be cut, by its true name. */
export const materialLabels: Readonly<Record<Material, string>> = {
  ...familyLabels,
  pvc: 'PVC',
  'treated-timber': 'treated timber',
  'carbon-fibre': 'carbon-fibre composite',
  'unknown-plastic': 'unknown plastic',
  'unknown-foam': 'unknown foam',
};

export const bitKindLabels: Readonly<Record<BitKind, string>> = {
  'up-cut': 'Up-cut',
  'down-cut': 'Down-cut',
  compression: 'Compression',
  straight: 'Straight',
  'ball-nose': 'Ball nose',
  'v-bit': 'V-bit',
  surfacing: 'Surfacing',
};

export const holdDownLabels: Readonly<Record<HoldDown, string>> = {
  'top-clamps': 'Top clamps',
  'side-clamps': 'Side clamps',
  tape: 'Tape and glue',
  screws: 'Screws',
  vacuum: 'Vacuum',
  tabs: 'Tabs only',
};

export const outcomeLabels: Readonly<Record<Outcome, string>> = {
  clean: 'Clean',
  usable: 'Usable',
  failed: 'Failed',
};

export const standingLabels: Readonly<Record<StandingWord, string>> = {
  uncut: 'uncut',
  'cut-once': 'cut once',
  proven: 'proven',
  'well-proven': 'well proven',
  disputed: 'disputed',
  withheld: 'withheld',
};

export const licenceLabels: Readonly<Record<Licence, string>> = {
  'CC0-1.0': 'CC0 1.0, no rights kept',
  'CC-BY-4.0': 'CC BY 4.0, credit',
  'CC-BY-SA-4.0': 'CC BY-SA 4.0, credit, share alike',
  'CC-BY-NC-4.0': 'CC BY-NC 4.0, credit, not for sale',
  'CC-BY-NC-SA-4.0': 'CC BY-NC-SA 4.0, credit, not for sale, share alike',
  'CC-BY-ND-4.0': 'CC BY-ND 4.0, credit, no changes',
  'CC-BY-NC-ND-4.0': 'CC BY-NC-ND 4.0, credit, not for sale, no changes',
  'CERN-OHL-P-2.0': 'CERN OHL-P 2.0, open hardware, permissive',
  'CERN-OHL-W-2.0': 'CERN OHL-W 2.0, open hardware, weakly reciprocal',
  'CERN-OHL-S-2.0': 'CERN OHL-S 2.0, open hardware, strongly reciprocal',
};

export const roleLabels: Readonly<Record<Role, string>> = {
  member: 'Member',
  moderator: 'Moderator',
  administrator: 'Administrator',
};

export const machineClassLabels: Readonly<Record<MachineClass, string>> = {
  'small-desktop': 'Small desktop',
  'belt-gantry': 'Gantry on belts',
  'screw-gantry': 'Gantry on screws',
  floor: 'Floor standing',
};

export const fitLabels: Readonly<Record<FitResult, string>> = {
  fits: 'fits',
  fitsIf: 'fits if',
  doesNotFit: 'does not fit',
  notKnown: 'not known',
};

export const sortLabels: Readonly<Record<Sort, string>> = {
  match: 'Best match',
  newest: 'Newest',
  title: 'Title',
  size: 'Size',
};

const fitCheckLabels: Readonly<Record<string, string>> = {
  bed: 'Bed',
  stock: 'Stock',
  'z-travel': 'Z travel',
  opening: 'Opening',
  bit: 'Bit',
  shank: 'Shank and collet',
  'cutting-length': 'Cutting length',
  spindle: 'Spindle',
  feed: 'Feed',
  plunge: 'Plunge',
};

/** What a check of the fit report is called; a check that is newer than this table by its own id. */
export const fitCheckLabel = (checkId: string): string =>
  fitCheckLabels[checkId] ?? (checkId.charAt(0).toUpperCase() + checkId.slice(1)).replaceAll('-', ' ');
