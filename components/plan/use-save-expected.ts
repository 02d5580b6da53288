import { useSavePart } from "@/components/lightship/use-save-part";
import type { ExpectedShip } from "./expected-typed";

export function useSaveExpected(test: string) {
  return useSavePart<ExpectedShip>(test, "expected");
}
