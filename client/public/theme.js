/* global document, matchMedia */
// Runs before the first paint, so that an evening bench never flashes white; src/lib/theme.ts keeps the same key.
{
  const kept = localStorage.getItem('borewright.theme');
  const evening =
    kept === 'evening' || (kept !== 'day' && matchMedia('(prefers-color-scheme: dark)').matches);
  document.documentElement.dataset.theme = evening ? 'evening' : 'day';
}
