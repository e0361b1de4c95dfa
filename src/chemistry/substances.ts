import { type Formula, molarMass } from "./atoms.js";

/** Formulas of the plain substances the trade weighs out. */
export const FORMULA = {
  water: { H: 2, O: 1 },
  hydrogen: { H: 2 },
  iodine: { I: 2 },
  glycerol: { C: 3, H: 8, O: 3 },
  methanol: { C: 1, H: 4, O: 1 },
  ethanol: { C: 2, H: 6, O: 1 },
  sodiumHydroxide: { Na: 1, O: 1, H: 1 },
  potassiumHydroxide: { K: 1, O: 1, H: 1 },
  sodiumMethoxide: { Na: 1, O: 1, C: 1, H: 3 },
  potassiumMethoxide: { K: 1, O: 1, C: 1, H: 3 },
} as const satisfies Record<string, Formula>;

export type Substance = keyof typeof FORMULA;

/** Molar masses of the plain substances [g/mol], exact from the atomic weights. */
export const MOLAR_MASS: Readonly<Record<Substance, number>> = Object.fromEntries(
  Object.entries(FORMULA).map(([name, formula]) => [name, molarMass(formula)]),
) as Record<Substance, number>;

/** What three acyl groups gain when they become a triglyceride: glycerol less three waters [g/mol]. */
export const GLYCEROL_RESIDUE = MOLAR_MASS.glycerol - 3 * MOLAR_MASS.water;

/** Milligrams of KOH in one mole, the unit in which saponification and acid values count. */
export const KOH_MG_PER_MOL = 1000 * MOLAR_MASS.potassiumHydroxide;

/** Hundredths of a gram of I2 in one mole: iodine value counts g I2 on 100 g of fat. */
export const IODINE_CG_PER_MOL = 100 * MOLAR_MASS.iodine;
