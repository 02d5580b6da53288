"use client";

type TypedDigitsProps = {
  typed: string;
  unit: string;
  /** what was taken before; a tap takes one out */
  taken?: readonly string[];
  onDrop?: (index: number) => void;
};

/** The digits being typed, as large as the hand that types them, and what was taken already. */
export function TypedDigits({ typed, unit, taken = [], onDrop }: TypedDigitsProps) {
  return (
    <div className="flex h-16 items-center gap-2 rounded border-2 border-ink-line bg-sailcloth-raised px-3">
      <ol className="flex min-w-0 flex-1 gap-1 overflow-x-auto" aria-label="Taken already">
        {taken
          .map((text, index) => ({ no: index + 1, text }))
          .map(({ no, text }) => (
            <li key={no} className="shrink-0">
              <button
                type="button"
                onClick={() => onDrop?.(no - 1)}
                aria-label={`Take out number ${no}, ${text} ${unit}`}
                className="flex min-h-tap min-w-tap flex-col items-center justify-center rounded border border-ink-line px-1.5 text-base leading-tight"
              >
                <span className="text-[0.65rem] text-ink-soft">{no}</span>
                {text}
              </button>
            </li>
          ))}
      </ol>
      <output aria-live="polite" aria-label="Typed" className="whitespace-nowrap text-[2.5rem] leading-none">
        {typed}
        <span aria-hidden="true" className="ml-0.5 inline-block h-[1.9rem] w-[3px] translate-y-1 bg-redlead" />
      </output>
      <span className="shrink-0 text-ink-soft">{unit}</span>
    </div>
  );
}
