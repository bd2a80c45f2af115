import { Library, type LucideIcon, Upload, Users, Wrench } from 'lucide-react';
import type { Role } from '#shared/api/vocabulary.ts';

export interface Place {
  readonly to: string;
  readonly label: string;
  readonly Icon: LucideIcon;
}

const everyone: readonly Place[] = [
  { to: '/', label: 'Loft', Icon: Library },
  { to: '/share', label: 'Share', Icon: Upload },
  { to: '/bench', label: 'Bench', Icon: Wrench },
];

/** Where the strip leads, for a role. */
export const placesFor = (role: Role): readonly Place[] =>
  role === 'administrator' ? [...everyone, { to: '/members', label: 'Members', Icon: Users }] : everyone;
