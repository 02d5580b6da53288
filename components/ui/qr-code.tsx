import { create } from "qrcode";

const QUIET = 4;

/** A text as a QR code, dark on light whatever the light of the page: cameras need it so. */
export function QrCode({ text, label }: { text: string; label: string }) {
  const { modules } = create(text, { errorCorrectionLevel: "M" });
  const size = modules.size + 2 * QUIET;
  return (
    <svg viewBox={`0 0 ${size} ${size}`} role="img" aria-label={label} className="h-auto w-full max-w-56" shapeRendering="crispEdges">
      <rect width={size} height={size} fill="#ffffff" />
      <path d={darkModules(modules)} fill="#000000" />
    </svg>
  );
}

function darkModules({ size, data }: { size: number; data: Uint8Array }): string {
  const dark: string[] = [];
  data.forEach((module, index) => {
    if (module) dark.push(`M${(index % size) + QUIET} ${Math.floor(index / size) + QUIET}h1v1h-1Z`);
  });
  return dark.join("");
}
