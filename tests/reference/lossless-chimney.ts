/** A piece of a chimney and what lies beyond it; susceptances over 1/(ρc). */
interface Piece {
  k: number;
  length: number;
  beyond: number;
}

/** Susceptance of a lossless cylinder with a load beyond it, by the textbook formula of a line. */
export function closedCylinderSusceptance({ k, radius, length, beyond }: Piece & { radius: number }): number {
  const own = Math.PI * radius * radius;
  const t = Math.tan(k * length);
  return (own * (beyond + own * t)) / (own - beyond * t);
}

/** Susceptance of a lossless cone from the inner to the outer radius with a load beyond it (spherical wave equation). */
export function closedConeSusceptance(piece: Piece & { inner: number; outer: number }): number {
  const { k, inner: r0, outer: r1, length, beyond } = piece;
  const s = (r1 - r0) / length;
  const [sine, cosine] = [Math.sin(k * length), Math.cos(k * length)];
  const a = (r1 / r0) * cosine - (s * sine) / (r0 * k);
  const b = sine / (Math.PI * r0 * r1);
  const curve = (s * s) / (r0 * r1 * k);
  const c = Math.PI * r0 * r1 * ((1 + curve / k) * sine - length * curve * cosine);
  const d = (r0 / r1) * cosine + (s * sine) / (r1 * k);
  return (c + d * beyond) / (a - b * beyond);
}
