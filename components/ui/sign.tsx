export type SignKind = "due" | "read" | "radio" | "paper" | "late" | "disagrees" | "settled" | "waiting" | "alert";

/** Drawn, not typed: a sign keeps its shape whatever fonts the machine has. It always stands beside its word. */
export function Sign({ kind, className = "h-3.5 w-3.5" }: { kind: SignKind; className?: string }) {
  return (
    <svg viewBox="0 0 16 16" aria-hidden="true" className={`inline-block shrink-0 fill-none stroke-current ${className}`} strokeWidth="1.8">
      {drawings[kind]}
    </svg>
  );
}

const drawings = {
  due: <circle cx="8" cy="8" r="5.5" strokeDasharray="3 2" />,
  read: <path d="M2.5 8.5 6.5 12.5 13.5 4" />,
  radio: <path d="M8 8v7M5 11a4 4 0 0 1 0-6M11 11a4 4 0 0 0 0-6M2.6 13.4a7.5 7.5 0 0 1 0-10.8M13.4 13.4a7.5 7.5 0 0 0 0-10.8" />,
  paper: <path d="M3.5 1.5h6l3 3v10h-9Z M6 7.5h4M6 10.5h4" />,
  late: <path d="M8 2.2a5.8 5.8 0 1 1 0 11.6A5.8 5.8 0 0 1 8 2.2ZM8 4.8V8l2.4 1.8" />,
  disagrees: <path d="M2.5 6h11M2.5 10.5h11M11.5 2 5 14.5" />,
  settled: <path d="M8 1.8 14.2 8 8 14.2 1.8 8Z M5.4 8.1l1.9 1.9 3.4-3.6" />,
  waiting: <path d="M4 8h.01M8 8h.01M12 8h.01" strokeLinecap="round" strokeWidth="2.4" />,
  alert: <path d="M8 1.8 14.8 14H1.2ZM8 6.2v3.6M8 11.6v.2" />,
} as const;
