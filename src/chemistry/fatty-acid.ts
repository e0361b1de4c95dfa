import { addFormulas, type Formula, molarMass } from "./atoms.js";
import { FORMULA } from "./substances.js";

/** What stands between two carbons: a double bond cis, trans or of unstated geometry, or a triple bond. */
export type UnsaturationKind = "cis" | "trans" | "double" | "triple";

/** One unsaturated bond; `position` counts from the carboxyl carbon (delta). */
export interface Unsaturation {
  readonly position: number;
  readonly kind: UnsaturationKind;
}

/**
 * Geometry of the double bonds as far as the label states it. `mixed` is known to hold both kinds in one chain,
 * `unstated` says nothing (a bare `18:1`, or no double bond at all).
 */
export type Geometry = "cis" | "trans" | "mixed" | "unstated";

/** A fatty acid, or the isomer sum a bare `C:D` stands for. Everything below follows from these counts. */
export interface FattyAcid {
  /** All carbons of the acid, branches and ring carbons included. */
  readonly carbons: number;
  /** C=C double bonds, those in a ring included. */
  readonly doubleBonds: number;
  /** C≡C triple bonds. */
  readonly tripleBonds: number;
  /** Carbocyclic rings (an epoxide is counted on its own). */
  readonly rings: number;
  readonly hydroxyls: number;
  readonly epoxides: number;
  /** Keto groups. */
  readonly oxos: number;
  readonly geometry: Geometry;
  /** Unsaturated bonds by position, ascending; `undefined` where the label leaves positions out. */
  readonly bonds: readonly Unsaturation[] | undefined;
  /** Position of the last double bond counted from the methyl end (the x of n-x); `undefined` where not known. */
  readonly omega: number | undefined;
  /** The project's code, e.g. `18:1(9c)`; positions left out where they are not known. Reads back as the same acid. */
  readonly code: string;
  /** Common name, e.g. `oleic acid`; `undefined` where there is none in use. */
  readonly commonName: string | undefined;
}

/** The forms in which a fatty acid is weighed. `triglyceride` is the simple one, three times the same acid. */
export const FORMS = ["acid", "methyl ester", "ethyl ester", "triglyceride", "sodium soap", "potassium soap"] as const;
export type Form = (typeof FORMS)[number];

/**
 * Molecular formula of the free acid.
 *
 * H = 2C - 2(C=C) - 4(C≡C) - 2(rings) - 2(epoxide) - 2(oxo); O = 2 + hydroxyl + epoxide + oxo.
 */
export function acidFormula(acid: FattyAcid): Formula {
  const missingPairs = acid.doubleBonds + 2 * acid.tripleBonds + acid.rings + acid.epoxides + acid.oxos;
  return {
    C: acid.carbons,
    H: 2 * (acid.carbons - missingPairs),
    O: 2 + acid.hydroxyls + acid.epoxides + acid.oxos,
  };
}

/** Molecular formula of an acid in one of its forms. */
export function formulaOf(acid: FattyAcid, form: Form): Formula {
  const free = acidFormula(acid);
  switch (form) {
    case "acid":
      return free;
    case "methyl ester":
      return addFormulas([free, 1], [FORMULA.methanol, 1], [FORMULA.water, -1]);
    case "ethyl ester":
      return addFormulas([free, 1], [FORMULA.ethanol, 1], [FORMULA.water, -1]);
    case "triglyceride":
      return addFormulas([free, 3], [FORMULA.glycerol, 1], [FORMULA.water, -3]);
    case "sodium soap":
      return addFormulas([free, 1], [FORMULA.sodiumHydroxide, 1], [FORMULA.water, -1]);
    case "potassium soap":
      return addFormulas([free, 1], [FORMULA.potassiumHydroxide, 1], [FORMULA.water, -1]);
  }
}

/**
 * Molar mass of an acid in one of its forms, with IUPAC conventional atomic weights.
 *
 * @returns molar mass [g/mol]
 * @see functions-meta/methods.md#molar-mass
 */
export function acidMolarMass(acid: FattyAcid, form: Form = "acid"): number {
  return molarMass(formulaOf(acid, form));
}

/** Moles of I2 one mole of the acid takes up: one for a double bond, two for a triple bond. */
export function iodineUptake(acid: FattyAcid): number {
  return acid.doubleBonds + 2 * acid.tripleBonds;
}
