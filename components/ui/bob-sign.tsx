/** The house's sign: a bob on its line before the batten. */
export function BobSign({ className = "h-7 w-7" }: { className?: string }) {
  return (
    <svg viewBox="0 0 32 32" className={className} aria-hidden="true">
      <line x1="14.4" y1="1" x2="18.8" y2="17" stroke="var(--ink)" strokeWidth="1.6" />
      <rect x="1" y="22" width="30" height="8" rx="1" fill="var(--batten)" stroke="var(--batten-edge)" />
      {[5, 10.5, 16, 21.5, 27].map((x) => (
        <line key={x} x1={x} y1="30" x2={x} y2={x === 16 ? 25 : 26.8} stroke="var(--batten-ink)" strokeWidth="1.2" />
      ))}
      <path d="M18.4 15.6 L22.6 20 L20.9 26.4 L16 21.2 Z" fill="var(--redlead)" />
    </svg>
  );
}
