/** The name with its sign: a bob on its line over the batten. */
export function Wordmark({ className = "" }: { className?: string }) {
  return (
    <span className={`inline-flex items-center gap-2 font-bold tracking-tight ${className}`}>
      <svg viewBox="0 0 32 32" className="h-7 w-7" aria-hidden="true">
        <line x1="16" y1="1" x2="19.5" y2="18" stroke="var(--ink)" strokeWidth="1.6" />
        <path d="M19.5 17 L23 21 L20.6 26 L17 21.6 Z" fill="var(--redlead)" />
        <rect x="1" y="25" width="30" height="6" rx="1" fill="var(--batten)" stroke="var(--batten-edge)" />
        {[5, 10.5, 16, 21.5, 27].map((x) => (
          <line key={x} x1={x} y1="25" x2={x} y2={x === 16 ? 29.5 : 28} stroke="var(--batten-ink)" strokeWidth="1.2" />
        ))}
      </svg>
      Battenbook
    </span>
  );
}
