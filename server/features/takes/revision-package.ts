import { strToU8, type Zippable, zipSync } from 'fflate';
import type { PackageSettings } from '#shared/api/package.ts';

/** Every file of a package carries this time, so that the same revision and settings give the same bytes. */
const fixedTime = new Date(2000, 0, 1, 0, 0, 0);

export interface PackageParts {
  drawingSvg: Uint8Array;
  originalSvg: Uint8Array;
  settings: PackageSettings;
  licenceAndCredits: string;
}

/** The package as one zip file: fixed order, fixed times. */
export function revisionPackage(parts: PackageParts): Uint8Array {
  const files: Zippable = {
    'drawing.svg': parts.drawingSvg,
    'original.svg': parts.originalSvg,
    'settings.json': strToU8(`${JSON.stringify(parts.settings, null, 2)}\n`),
    'LICENCE-AND-CREDITS.txt': strToU8(parts.licenceAndCredits),
  };
  return zipSync(files, { level: 6, mtime: fixedTime });
}
