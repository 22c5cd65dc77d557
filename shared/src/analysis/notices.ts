import { WINDOW_RANGE } from '../acoustics/mouth-end/window.ts';
import { LIP_RANGE } from '../acoustics/mouth-end/embouchure.ts';
import { RIM_RANGE } from '../acoustics/mouth-end/rim.ts';
import { CARBON_DIOXIDE_CHECKED_TO } from '../acoustics/air/humid-air.ts';
import type { DesignDocument, MouthEnd } from '../document/design-document.ts';
import { diameterAt } from '../document/profile.ts';
import { holeNotices } from './hole-notices.ts';
import type { Notice } from './prediction.ts';
import { isOutside } from './range.ts';

/** Bore steps whose own inertia is small; two stations at one place beyond these are said. */
const STEP_RANGE = { from: 0.8, to: 1.25 };

/** Half-angle of a cone up to which plane waves were held against spherical ones (0.6 cent there), degrees. */
const STEEPEST_CONE_DEG = 1.6;

/** Everything that is true of the whole design: formulas outside their range, choices the document leaves open. */
export function designNotices(document: DesignDocument): Notice[] {
  return [
    ...airNotices(document),
    ...boreNotices(document),
    ...outsideNotices(document),
    ...mouthNotices(document),
    ...document.holes.flatMap((hole) => holeNotices(document, hole)),
  ];
}

function airNotices({ air }: DesignDocument): Notice[] {
  const notices: Notice[] = [];
  if (air.co2Fraction > CARBON_DIOXIDE_CHECKED_TO) {
    notices.push({
      code: 'air-carbon-dioxide',
      message: `The speed of sound is checked up to ${CARBON_DIOXIDE_CHECKED_TO * 100} % carbon dioxide; beyond it pitches may be off by a cent or two.`,
    });
  }
  if (air.fixed !== null) {
    notices.push({
      code: 'air-fixed',
      message: 'Speed of sound and density are fixed by hand: temperature does not move the pitches.',
    });
  }
  return notices;
}

/** The outside sets chimneys and what the openings radiate into: where it was not measured it is a guess. */
function outsideNotices({ bore, outside, holes }: DesignDocument): Notice[] {
  const from = outside.stations[0]?.positionMm ?? 0;
  const to = outside.stations.at(-1)?.positionMm ?? 0;
  const footMm = bore.stations.at(-1)?.positionMm ?? 0;
  const isBare = (positionMm: number) => positionMm < from - 0.05 || positionMm > to + 0.05;
  const notices: Notice[] = [];
  if (to > footMm + 0.05) {
    notices.push({
      code: 'outside-beyond-foot',
      message: `The outside runs on ${(to - footMm).toFixed(1)} mm beyond the end of the bore. The foot is worked out as if the wood ended with the bore.`,
    });
  }
  if (!isBare(footMm) && !holes.some((hole) => isBare(hole.positionMm))) return notices;
  return [
    ...notices,
    {
      code: 'outside-not-covered',
      message: `The outside is given from ${(footMm - to).toFixed(1)} to ${(footMm - from).toFixed(1)} mm from the foot only. Its end diameters are carried on to the holes and the foot beyond; measure it there.`,
    },
  ];
}

function boreNotices({ bore, mouthEnd }: DesignDocument): Notice[] {
  const notices: Notice[] = [];
  const fromFoot = (positionMm: number) => ((bore.stations.at(-1)?.positionMm ?? 0) - positionMm).toFixed(1);
  bore.stations.forEach((station, index) => {
    const before = bore.stations[index - 1];
    if (before === undefined) return;
    const along = station.positionMm - before.positionMm;
    const ratio = station.diameterMm / before.diameterMm;
    if (along === 0 && isOutside(ratio, STEP_RANGE)) {
      notices.push({
        code: 'bore-step',
        message: `The bore steps from ${before.diameterMm.toFixed(1)} to ${station.diameterMm.toFixed(1)} mm at ${fromFoot(station.positionMm)} from the foot. The air's inertia at so large a step is left out; notes may be some cents sharper than they sound.`,
      });
    }
    const slope = Math.abs(station.diameterMm - before.diameterMm) / (2 * along);
    if (along > 0 && Math.atan(slope) > (STEEPEST_CONE_DEG * Math.PI) / 180) {
      notices.push({
        code: 'bore-steep-cone',
        message: `The bore widens or narrows steeply between ${fromFoot(station.positionMm)} and ${fromFoot(before.positionMm)} mm from the foot. Waves are taken as plane there, which may cost a cent or more.`,
      });
    }
  });
  if (mouthEnd.kind === 'embouchure' && (bore.stations[0]?.positionMm ?? 0) > -mouthEnd.stopperMm) {
    notices.push({
      code: 'bore-extended-to-stopper',
      message:
        'The bore table begins after the stopper. It is carried on to the stopper with its first diameter.',
    });
  }
  return notices;
}

function mouthNotices(document: DesignDocument): Notice[] {
  const end = document.mouthEnd;
  switch (end.kind) {
    case 'window':
      return windowNotices(document, end);
    case 'embouchure':
      return embouchureNotices(document, end);
    case 'rim':
      return isOutside(end.cover, RIM_RANGE.fraction)
        ? [
            mouthNotice(
              'rim-cover',
              'The rule for the rim under chin and lips holds for a cover of 0.2 to 0.85.',
            ),
          ]
        : [];
    case 'reed':
      return [
        mouthNotice(
          'reed-uncalibrated',
          'A reed moves every note by 10 to 50 cents. Calibrate it on one measured set of notes before trusting pitches; trust differences until then.',
        ),
      ];
    case 'ideal-open':
    case 'ideal-closed':
      return [];
  }
}

function mouthNotice(code: string, what: string): Notice {
  return { code, message: what };
}

function windowNotices(document: DesignDocument, end: Extract<MouthEnd, { kind: 'window' }>): Notice[] {
  const radius = diameterAt(document.bore.stations, -end.lengthMm) / 2;
  const measures = [
    { name: 'width', value: end.widthMm / radius, range: WINDOW_RANGE.width, scale: radius },
    { name: 'length', value: end.lengthMm / radius, range: WINDOW_RANGE.length, scale: radius },
    { name: 'wall', value: end.wallMm / radius, range: WINDOW_RANGE.wall, scale: radius },
    {
      name: 'ramp',
      value: (end.rampDeg * Math.PI) / 180,
      range: WINDOW_RANGE.ramp,
      scale: 180 / Math.PI,
    },
  ];
  return measures
    .filter(({ value, range }) => isOutside(value, range))
    .map(({ name, range, scale }) =>
      mouthNotice(
        `window-${name}-outside-formula`,
        `The window's ${name} lies outside what its formula was made from, ${(range.from * scale).toFixed(1)} to ${(range.to * scale).toFixed(1)} here. All notes may be off by several cents; calibrate on a finished head.`,
      ),
    );
}

function embouchureNotices(
  document: DesignDocument,
  end: Extract<MouthEnd, { kind: 'embouchure' }>,
): Notice[] {
  const radius = Math.sqrt(end.lengthMm * end.widthMm) / 2;
  const outer = diameterAt(document.outside.stations, 0) / 2;
  const ratio = Math.max(end.lengthMm / end.widthMm, end.widthMm / end.lengthMm);
  const checks = [
    {
      outside: isOutside(end.lipCover, LIP_RANGE.fraction),
      code: 'lip-cover-outside-formula',
      what: 'Lips were studied covering 0.2 to 0.6 of the embouchure hole.',
    },
    {
      outside: isOutside((end.lipAngleDeg * Math.PI) / 180, LIP_RANGE.angle),
      code: 'lip-angle-outside-formula',
      what: 'Lips were studied at angles from 60 to 120 degrees.',
    },
    {
      outside: isOutside(outer / radius, LIP_RANGE.outerRadius),
      code: 'embouchure-body-outside-formula',
      what: `Embouchure holes were studied in bodies ${LIP_RANGE.outerRadius.from} to ${LIP_RANGE.outerRadius.to} times as wide as the hole.`,
    },
    {
      outside: isOutside(ratio, LIP_RANGE.axisRatio),
      code: 'embouchure-shape-outside-formula',
      what: 'The embouchure hole is longer one way than those studied, which were at most 1.2 times.',
    },
  ];
  return checks
    .filter(({ outside }) => outside)
    .map(({ code, what }) =>
      mouthNotice(code, `${what} All notes may be off by several cents; calibrate on a finished instrument.`),
    );
}
