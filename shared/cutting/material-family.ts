import {
  type HazardousMaterial,
  type Material,
  type MaterialFamily,
  materialFamilies,
} from '../api/vocabulary.ts';

/** The family that settings and evidence are kept by; null for stock that must not be cut at all. */
export const familyOf = (material: Material): MaterialFamily | null =>
  materialFamilies.find((family) => family === material) ?? null;

/** Stock that must not be cut at all. */
export const isHazardous = (material: Material): material is HazardousMaterial => familyOf(material) === null;
