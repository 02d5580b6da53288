/** While the server works a page out. */
export function Loading() {
  return <output className="mx-auto block max-w-page px-4 py-8 text-ink-soft">Fetching the page from the server</output>;
}
