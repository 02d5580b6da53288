export type PadKey = "0" | "1" | "2" | "3" | "4" | "5" | "6" | "7" | "8" | "9" | "." | "," | "sign" | "backspace" | "clear";

const MOST_CHARACTERS = 9;
const minusSign = "−";

/** The text as typed after one more key: one decimal mark, comma or point, and a minus only in front. */
export function typedAfter(text: string, key: PadKey): string {
  if (key === "clear") return "";
  if (key === "backspace") return text.slice(0, -1);
  if (key === "sign") return text.startsWith(minusSign) ? text.slice(1) : minusSign + text;
  if (text.length >= MOST_CHARACTERS) return text;
  if (key === "." || key === ",") return withDecimalMark(text, key);
  return text === "0" || text === `${minusSign}0` ? text.slice(0, -1) + key : text + key;
}

/** The pad's key for a key of a real keyboard, where one is plugged in. */
export function keyPressed(key: string): PadKey | null {
  if (/^[0-9.,]$/.test(key)) return key as PadKey;
  if (key === "-" || key === minusSign) return "sign";
  if (key === "Backspace") return "backspace";
  return key === "Delete" ? "clear" : null;
}

function withDecimalMark(text: string, mark: string): string {
  if (/[.,]/.test(text)) return text;
  return /\d$/.test(text) ? text + mark : `${text}0${mark}`;
}
