import type { Hydrometer } from "@/lib/hydrostatics/water-density";
import type { IncliningTestData, TestTank } from "../test-data";
import type { TestWeight } from "../test-plan";
import type { Provenance, TestReadings } from "../test-readings";
import type { Limited } from "./check-limits";

/** What was noted of the surroundings at a move; headcount of people aboard, clearance under the keel [m]. */
export type Conditions = Provenance & { readonly move: number; readonly underKeel?: number; readonly headcount?: number };

/** A test with what the reduction does not need but the checks look at; a test record is one of these. */
export type CheckedTest = Limited &
  Omit<IncliningTestData, "tanks" | "weights" | "hydrometers" | "readings"> & {
    readonly tanks: readonly (TestTank & { readonly kind?: "deep" | "double-bottom" })[];
    readonly weights: readonly (TestWeight & { readonly certificate?: string })[];
    readonly hydrometers?: readonly (Hydrometer & { readonly certificate?: string })[];
    readonly readings: TestReadings & { readonly conditions?: readonly Conditions[] };
  };
