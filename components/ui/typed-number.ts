const minusSign = "−";

/** The number that stands in the text; null while it holds none yet. */
export function typedNumber(text: string): number | null {
  const plain = text.trim().replace(minusSign, "-").replace(",", ".");
  if (!/^-?(\d+\.?\d*|\.\d+)$/.test(plain)) return null;
  return Number(plain);
}

/** How a number would have been typed. */
export function typedText(value: number): string {
  return String(value).replace("-", minusSign);
}
