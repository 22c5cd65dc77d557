import { useEffect } from 'react';

/** F6 goes from zone to zone of the bench; with Shift back. Zones carry `data-zone` and can hold the focus. */
export function useZones(): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (event.key !== 'F6') return;
      const zones = [...document.querySelectorAll<HTMLElement>('[data-zone]')].filter(
        (zone) => zone.offsetParent !== null,
      );
      if (zones.length === 0) return;
      event.preventDefault();
      const at = zones.findIndex((zone) => zone.contains(document.activeElement));
      const next = (at + (event.shiftKey ? -1 : 1) + zones.length) % zones.length;
      zones[at < 0 ? 0 : next]?.focus();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
}
