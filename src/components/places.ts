import { Library, ListChecks, type LucideIcon, Scale, Upload, Users, Wrench } from 'lucide-react';
import type { Role } from '#shared/api/vocabulary.ts';

export interface Place {
  readonly to: string;
  readonly label: string;
  /** Where there is room for one word only. */
  readonly shortLabel?: string;
  readonly Icon: LucideIcon;
}

const everyone: readonly Place[] = [
  { to: '/', label: 'Loft', Icon: Library },
  { to: '/share', label: 'Share', Icon: Upload },
  { to: '/bench', label: 'Bench', Icon: Wrench },
  { to: '/log', label: 'Cut log', Icon: ListChecks },
];

export const reviewDesk: Place = { to: '/review', label: 'Review desk', shortLabel: 'Review', Icon: Scale };
const members: Place = { to: '/members', label: 'Members', Icon: Users };

const placesOf: Readonly<Record<Role, readonly Place[]>> = {
  member: everyone,
  moderator: [...everyone, reviewDesk],
  administrator: [...everyone, reviewDesk, members],
};

/** Where the strip leads, for a role. */
export const placesFor = (role: Role): readonly Place[] => placesOf[role];
