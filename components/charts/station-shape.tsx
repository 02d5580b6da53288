/** One marker per station, told apart by shape; the order is the plan's. */
export function StationShape({ index, hollow, size = 6 }: { index: number; hollow: boolean; size?: number }) {
  const path = shapes[index % shapes.length] as (size: number) => string;
  return <path d={path(size)} className={hollow ? "fill-sailcloth-raised stroke-ink" : "fill-ink stroke-ink"} strokeWidth={1.75} />;
}

const shapes: readonly ((size: number) => string)[] = [circle, square, triangle, diamond, triangleDown, plus, hexagon];

function circle(size: number) {
  return `M${-size} 0a${size} ${size} 0 1 0 ${2 * size} 0a${size} ${size} 0 1 0 ${-2 * size} 0Z`;
}

function square(size: number) {
  const half = size * 0.9;
  return `M${-half} ${-half}H${half}V${half}H${-half}Z`;
}

function triangle(size: number) {
  return `M0 ${-size * 1.25}L${size * 1.15} ${size * 0.8}H${-size * 1.15}Z`;
}

function diamond(size: number) {
  return `M0 ${-size * 1.3}L${size * 1.1} 0L0 ${size * 1.3}L${-size * 1.1} 0Z`;
}

function triangleDown(size: number) {
  return `M0 ${size * 1.25}L${size * 1.15} ${-size * 0.8}H${-size * 1.15}Z`;
}

function plus(size: number) {
  const arm = size * 0.4;
  return `M${-arm} ${-size}H${arm}V${-arm}H${size}V${arm}H${arm}V${size}H${-arm}V${arm}H${-size}V${-arm}H${-arm}Z`;
}

function hexagon(size: number) {
  return `M${-size} 0L${-size / 2} ${-size}H${size / 2}L${size} 0L${size / 2} ${size}H${-size / 2}Z`;
}
