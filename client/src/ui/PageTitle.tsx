/** Names the browser's tab and history entry. */
export function PageTitle({ children }: { children: string }) {
  return <title>{`${children} · Borewright`}</title>;
}
