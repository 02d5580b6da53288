import type { UseFormRegisterReturn } from "react-hook-form";

/** How the bob was read: at rest, or at the ends of its swing. */
export function SwingMode({ register }: { register: (name: "mode") => UseFormRegisterReturn }) {
  return (
    <fieldset className="flex flex-wrap gap-x-5">
      <legend className="sr-only">How the bob was read</legend>
      <label className="flex min-h-tap items-center gap-2">
        <input type="radio" value="settled" className="h-5 w-5 accent-redlead" {...register("mode")} />
        Settled
      </label>
      <label className="flex min-h-tap items-center gap-2">
        <input type="radio" value="turning-points" className="h-5 w-5 accent-redlead" {...register("mode")} />
        Turning points of a swing
      </label>
    </fieldset>
  );
}
