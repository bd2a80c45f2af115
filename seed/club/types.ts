import type {
  BitKind,
  HoldDown,
  Kind,
  Licence,
  MachineClass,
  MaterialFamily,
  Outcome,
  Role,
} from '#shared/api/vocabulary.ts';
import type { WentWrong } from '#shared/evidence/went-wrong.ts';

/** The demo club as plain data: field names follow the contract, so that the seeding runner only maps. */

export type MemberKey = 'ada' | 'moss' | 'wren' | 'tarn' | 'fern' | 'heron' | 'sorrel';

export interface SeedMember {
  readonly key: MemberKey;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
}

type SeedSpindle =
  | { readonly kind: 'range'; readonly minRpm: number; readonly maxRpm: number }
  | { readonly kind: 'dial'; readonly positionsRpm: readonly number[] };

export interface SeedMachine {
  readonly owner: MemberKey;
  readonly name: string;
  readonly class: MachineClass;
  readonly bedXMm: number;
  readonly bedYMm: number;
  readonly marginMm: {
    readonly left: number;
    readonly right: number;
    readonly front: number;
    readonly back: number;
  };
  readonly clampStripMm: number;
  readonly zTravelMm: number;
  readonly openingMm: number;
  readonly maxFeedMmPerMin: number;
  readonly maxPlungeMmPerMin: number;
  readonly rapidMmPerMin: number;
  /** Left out where the member has not measured it: the class default stands in. */
  readonly accelerationMmPerS2?: number;
  readonly spindle: SeedSpindle;
  readonly spindlePowerW: number;
  readonly colletsMm: readonly number[];
}

export interface SeedBit {
  readonly owner: MemberKey;
  readonly name: string;
  readonly kind: BitKind;
  readonly diameterMm: number;
  readonly shankMm: number;
  readonly flutes: number;
  readonly cuttingLengthMm: number;
  readonly canPlunge: boolean;
  readonly maxRpm?: number;
  readonly angleDeg?: number;
}

interface BitUsed {
  readonly diameterMm: number;
  readonly flutes: number;
  readonly kind: BitKind;
}

export interface CutSettings {
  readonly spindleRpm: number;
  readonly feedMmPerMin: number;
  readonly plungeMmPerMin: number;
  readonly depthOfCutMm: number;
  readonly stepoverMm: number;
}

/** What both a first cut (shared with the design) and a later cut record tell. */
export interface CutTold {
  readonly machine: string;
  readonly bit: BitUsed;
  readonly materialId: MaterialFamily;
  readonly stockThicknessMm: number;
  readonly settings: CutSettings;
  readonly holdDown: HoldDown;
  readonly outcome: Outcome;
  readonly runTimeS: number;
  readonly notes: string;
}

export interface SeedDesign {
  /** Also the key of its sheet in seed/drawings/all.ts. */
  readonly key: string;
  readonly owner: MemberKey;
  readonly title: string;
  readonly summary: string;
  readonly kind: Kind;
  readonly licence: Licence;
  readonly tags: readonly string[];
  /** ISO 8601, UTC. */
  readonly publishedAt: string;
  /** Stated by the owner where the file's units are not confirmed. */
  readonly scale?: { readonly millimetresPerUnit: number };
  /** Absent: uncut. */
  readonly cut?: CutTold;
}

export interface SeedCut extends CutTold {
  readonly design: string;
  readonly member: MemberKey;
  /** Local date of the cut. */
  readonly cutOn: string;
  readonly overridePercent?: number;
  readonly wentWrong?: readonly WentWrong[];
  readonly measured?: readonly { readonly drawnMm: number; readonly measuredMm: number }[];
  /** Weeks later, with the part in use. */
  readonly inService?: { readonly notedOn: string; readonly holds: boolean; readonly notes: string };
}

/** A later revision of a design: its drawing is another sheet of seed/drawings/all.ts. */
export interface SeedRevision {
  readonly design: string;
  readonly sheet: string;
  /** ISO 8601, UTC. */
  readonly issuedAt: string;
  readonly changeNote: string;
  readonly cut?: CutTold;
}

export interface SeedRemix extends SeedDesign {
  readonly parent: { readonly design: string; readonly revision: number };
  readonly changeNote: string;
}

export interface SeedFlag {
  readonly design: string;
  readonly by: MemberKey;
  readonly raisedAt: string;
  readonly reason: string;
  /** Absent while it is open. */
  readonly decision?: {
    readonly by: MemberKey;
    readonly decidedAt: string;
    readonly action: 'dismiss' | 'caution' | 'withholdSettings' | 'withholdRevision' | 'withholdDesign';
    readonly reason: string;
  };
}
