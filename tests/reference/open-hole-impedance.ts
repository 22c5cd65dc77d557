import { selfRadiation } from '#shared/acoustics/radiation/cylinder-radiation.ts';
import { innerLength } from '#shared/acoustics/tone-hole/inner-length.ts';
import { matchingLength } from '#shared/acoustics/tone-hole/matching-length.ts';
import { radiationLength } from '#shared/acoustics/tone-hole/radiation-length.ts';
import { imaginary, plus, throughLine, type Phasor } from './phasor.ts';

const g = new Float64Array(2);

/**
 * Lossless impedance of an open straight hole in a tube, node compliance not counted, over the hole's own: the elements put
 * together by hand, apart from the engine's own chain.
 */
export function openHoleImpedance(
  [bore, radius, chimney]: readonly [bore: number, radius: number, chimney: number],
  wavenumber: number,
): Phasor {
  const outer = bore + chimney;
  selfRadiation(wavenumber * outer, g, 0);
  const share = (radius * radius) / (4 * outer);
  const load = {
    re: -wavenumber * share * g[1]!,
    im: wavenumber * (radiationLength(radius, outer) + share * g[0]!),
  };
  const top = throughLine(load, wavenumber * (chimney + matchingLength(bore, radius)));
  return plus(top, imaginary(wavenumber * innerLength(bore, radius, chimney)));
}
