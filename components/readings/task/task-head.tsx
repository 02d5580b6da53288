type TaskHeadProps = { over: string; title: string; place: string; when: string };

/** What is read, where, and in which round. */
export function TaskHead({ over, title, place, when }: TaskHeadProps) {
  return (
    <header className="pb-2">
      <p className="text-ink-soft text-small">
        {over} · {when}
      </p>
      <h1 className="truncate font-bold text-title leading-tight">{title}</h1>
      <p className="truncate text-small">{place || "\u00a0"}</p>
    </header>
  );
}
