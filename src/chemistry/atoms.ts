/**
 * Conventional atomic weights [g/mol].
 *
 * Source: IUPAC/CIAAW conventional values (H, C, O, N, S are interval elements; the conventional value is used),
 * other elements standard atomic weights. Values from memory, except those also seen in the four-digit IUPAC 2016 table.
 */
export const ATOMIC_WEIGHT = {
  H: 1.008,
  C: 12.011,
  N: 14.007,
  O: 15.999,
  Na: 22.98976928,
  S: 32.06,
  K: 39.0983,
  I: 126.90447,
} as const;

export type Element = keyof typeof ATOMIC_WEIGHT;

/** A molecular formula as counts of atoms; elements that are left out count zero. */
export type Formula = Readonly<Partial<Record<Element, number>>>;

/** Order in which a formula is written: carbon, hydrogen, then the rest by alphabet (Hill order). */
const HILL_ORDER: readonly Element[] = ["C", "H", "I", "K", "N", "Na", "O", "S"];

/**
 * Molar mass of a formula.
 *
 * @returns molar mass [g/mol]
 * @example molarMass({ C: 18, H: 34, O: 2 }); // 282.468
 */
export function molarMass(formula: Formula): number {
  return HILL_ORDER.reduce((sum, element) => sum + (formula[element] ?? 0) * ATOMIC_WEIGHT[element], 0);
}

/**
 * Sum of formulas, each taken `times` times (negative counts take atoms away).
 *
 * @example addFormulas([{ H: 2, O: 1 }, 2], [{ H: 2 }, -1]); // { H: 2, O: 2 }
 */
export function addFormulas(...parts: readonly (readonly [Formula, number])[]): Formula {
  const sum: Partial<Record<Element, number>> = {};
  for (const [formula, times] of parts) {
    for (const element of HILL_ORDER) {
      const count = (formula[element] ?? 0) * times;
      if (count !== 0) sum[element] = (sum[element] ?? 0) + count;
    }
  }
  return sum;
}

/**
 * A formula as text in Hill order.
 *
 * @example formulaText({ O: 2, H: 34, C: 18 }); // "C18H34O2"
 */
export function formulaText(formula: Formula): string {
  return HILL_ORDER.filter((element) => (formula[element] ?? 0) > 0)
    .map((element) => `${element}${formula[element] === 1 ? "" : String(formula[element])}`)
    .join("");
}
