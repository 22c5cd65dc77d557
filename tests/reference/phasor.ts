/** A complex number, for checks that put elements together by hand. */
export interface Phasor {
  re: number;
  im: number;
}

export const real = (re: number): Phasor => ({ re, im: 0 });
export const imaginary = (im: number): Phasor => ({ re: 0, im });

export function plus(a: Phasor, b: Phasor): Phasor {
  return { re: a.re + b.re, im: a.im + b.im };
}

export function times(a: Phasor, b: Phasor): Phasor {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re };
}

export function inverse(a: Phasor): Phasor {
  const norm = a.re * a.re + a.im * a.im;
  return { re: a.re / norm, im: -a.im / norm };
}

/** Impedance at the near end of a lossless line of a phase length, over its characteristic impedance. */
export function throughLine(load: Phasor, phase: number): Phasor {
  const t = imaginary(Math.tan(phase));
  return times(plus(load, t), inverse(plus(real(1), times(load, t))));
}
