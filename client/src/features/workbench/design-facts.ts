import type { DesignDocument, MouthEndKind } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';

const KIND_WORDS: Record<MouthEndKind, string> = {
  window: 'fipple whistle',
  embouchure: 'transverse flute',
  rim: 'end-blown flute',
  reed: 'reed pipe',
  'ideal-open': 'pipe with an ideal open end',
  'ideal-closed': 'pipe with an ideal closed end',
};

const ZERO_WORDS: Record<MouthEndKind, string> = {
  window: 'lip to foot',
  embouchure: 'embouchure hole to foot',
  rim: 'long',
  reed: 'reed seat to foot',
  'ideal-open': 'long',
  'ideal-closed': 'long',
};

const NUMBER_WORDS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight', 'Nine', 'Ten'];

/** "Six-hole fipple whistle in D, bore 12.7 mm, 265.0 mm lip to foot". */
export function designFacts(document: DesignDocument, unit: LengthUnit): string {
  const { kind } = document.mouthEnd;
  const count = document.holes.length;
  const diameters = document.bore.stations.map((station) => station.diameterMm);
  const [first = 0, last = 0] = [diameters[0], diameters.at(-1)];
  const straight = diameters.every((diameterMm) => diameterMm === first);
  const bore = straight
    ? `bore ${printLength(first, unit)} ${unit}`
    : `bore ${printLength(first, unit)} to ${printLength(last, unit)} ${unit}`;
  const holes = `${NUMBER_WORDS[count] ?? String(count)}${count === 0 ? ' holes yet:' : '-hole'}`;
  const length = `${printLength(boreEnds(document).footMm, unit)} ${unit} ${ZERO_WORDS[kind]}`;
  return `${holes} ${KIND_WORDS[kind]} in ${document.pitch.tonic}, ${bore}, ${length}`;
}
