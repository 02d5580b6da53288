/** Which length is meant: the liquid's depth, or the empty height above it. The level is not to scale. */
export function TankSketch({ measure }: { measure: "sounding" | "ullage" }) {
  const [from, to] = measure === "sounding" ? [58, 92] : [8, 58];
  return (
    <svg viewBox="0 0 336 100" role="img" aria-label={words[measure]} className="block w-full">
      <rect x="24" y="16" width="160" height="76" className="fill-sailcloth-raised stroke-ink" strokeWidth="2" />
      <rect x="25" y="58" width="158" height="33" className="fill-ink opacity-20" />
      <path d="M100 4h12v12M100 4v12" className="fill-none stroke-ink" strokeWidth="2" />
      <line x1="106" x2="106" y1="8" y2={measure === "sounding" ? 92 : 58} className="stroke-ink" strokeWidth="1.5" />
      <path d={`M150 ${from}v${to - from}M143 ${from}h14M143 ${to}h14`} className="fill-none stroke-redlead" strokeWidth="3" />
      <text x="200" y="46" className="fill-ink font-bold text-[16px]">
        {measure === "sounding" ? "Sounding" : "Ullage"}
      </text>
      <text x="200" y="64" className="fill-ink-soft text-[12px]">
        {words[measure]}
      </text>
    </svg>
  );
}

const words = { sounding: "depth of the liquid", ullage: "empty height above it" } as const;
