import type { FattyAcid } from "../fatty-acid.js";

/**
 * What a label in the acid column turns out to be.
 *
 * `acid`: a fatty acid (or isomer sum) with what was assumed on the way, in words for `READ`;
 * `sum`: a subtotal or total of other rows (`Total`, `ΣSFA`, `MUFA`), never part of the composition;
 * `unidentified`: stays in the total with unknown structure (`Others`, `Unknown`);
 * `unreadable`: nothing of the above; `reason` says why in words that follow the quoted label, and may be empty.
 */
export type Label =
  | { readonly kind: "acid"; readonly acid: FattyAcid; readonly assumptions: readonly string[] }
  | { readonly kind: "sum"; readonly what: string }
  | { readonly kind: "unidentified" }
  | { readonly kind: "unreadable"; readonly reason: string };
