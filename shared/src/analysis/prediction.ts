/** What a prediction says; plain data, units in the names. Made by `predictDesign`, stored by the server, shown by the client. */

/** Something a maker has to know about a figure: a formula outside its range, a weak or missing resonance. */
export interface Notice {
  /** Stable name, kebab-case, for example `hole-wider-than-formula`. */
  code: string;
  /** One or two sentences in a maker's words. */
  message: string;
  /** The hole it is about, by id. */
  hole?: string | undefined;
  /** The fingering it is about, by id. */
  fingering?: string | undefined;
}

export interface LadderRung {
  /** Counts the resonances of this mouth end from 1, lowest first. */
  mode: number;
  frequencyHz: number;
  /** Cents above the exact multiple (1:2:3… open–open, 1:3:5… open–closed) of mode 1 of this ladder. */
  centsFromMultiple: number;
  /** Height of the resonance against the strongest of this ladder, dB, 0 or less. */
  strength: number;
  /** True for a resonance above the cutoff, 1/3 < |Z|/Z0 < 3: no use as a note. */
  weak: boolean;
}

/** One thing that a note's figure rests on, and how far it may be off, ± cents. */
export interface AccuracyPart {
  part: 'bore-and-holes' | 'losses' | 'undercut' | 'half-covered' | 'pad' | 'mouth-end';
  cents: number;
  /** The same once the mouth end is calibrated on a measured set of notes; only where that narrows it. */
  calibratedCents?: number | undefined;
}

export interface FingeringPrediction {
  id: string;
  note: string;
  register: number;
  /** What the scale asks for, Hz, with the fingering's own offset. */
  targetHz: number;
  /** Sounding frequency; null when no resonance answers, and then a notice says why. */
  frequencyHz: number | null;
  centsFromScale: number | null;
  /** Beats per second against the target. */
  beatsHz: number | null;
  /** Which rung of the ladder sounds. */
  mode: number | null;
  ladder: LadderRung[];
  /** The open hole nearest the mouth end, whose column the note hangs under; null: the foot. */
  ventHole: string | null;
  /** Above this the open holes leak, Hz; null with no open holes. */
  cutoffHz: number | null;
  /** Expected accuracy of this figure before calibration, ± cents. */
  accuracyCents: number;
  /** And after it. */
  calibratedAccuracyCents?: number | undefined;
  /** What that is made of. */
  accuracy?: AccuracyPart[] | undefined;
  notices: Notice[];
}

export interface DesignPrediction {
  /** Name and version of the engine, for example `borewright 1.0.0`. */
  engine: string;
  /** What is true of the whole design; notices about one fingering stand with it. */
  notices: Notice[];
  fingerings: FingeringPrediction[];
}

/** Cents per unit of each dimension, for every note. Keys are document paths such as `holes.2.diameterMm`. */
export interface DesignSensitivities {
  engine: string;
  fingerings: { id: string; centsPerUnit: Record<string, number> }[];
}

/** Input impedance in units of the input's characteristic impedance. */
export interface ImpedanceCurve {
  fingering: string;
  points: { frequencyHz: number; re: number; im: number }[];
}
