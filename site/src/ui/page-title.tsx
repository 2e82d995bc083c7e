/** The document's title; React lifts it into the head. */
export function PageTitle({ children }: { children: string }) {
  return <title>{`${children} – Ferrule`}</title>;
}
