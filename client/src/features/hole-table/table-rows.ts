import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds, chimneyMm, diameterAt, fromFootMm } from '#shared/document/profile.ts';
import { formatCents } from '#shared/music/cents.ts';
import { changeHole, snapPosition, widestHoleMm, withUndercut } from '../../bench/hole-edits.ts';
import type { LabelledHole } from '#shared/document/hole-labels.ts';
import { centsPerStep, leadingNote, SENSITIVITY_STEP } from '../../bench/hole-sensitivity.ts';
import type { HungNote } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';

/** A size that can be typed over. */
export interface EditableFigure {
  kind: 'length' | 'angle';
  value: number;
  min: number;
  max: number;
  /** Nothing special about it: no undercut, no turn. */
  isQuiet: boolean;
  /** What stands there instead while it is not being typed over. */
  quietText?: string;
  edit: (document: DesignDocument, value: number) => DesignDocument;
}

export interface TableRow {
  key: string;
  label: string;
  unit: string;
  /** On a tablet the others wait behind More. */
  isMain: boolean;
  editable?: (labelled: LabelledHole) => EditableFigure;
  /** Figures that are worked out; by column, null where there is nothing to say. */
  figure?: (column: string) => string | null;
  /** Stands between a column and the next. */
  between?: (labelled: LabelledHole, next: LabelledHole) => number;
  /** What stands in the foot's column. */
  foot?: string;
}

const LONGEST_ANGLE = 360;

export interface RowSource extends Pick<PanelProps, 'document' | 'sensitivities' | 'unit' | 'selection'> {
  holes: readonly LabelledHole[];
  notes: readonly HungNote[];
  printLength: (mm: number) => string;
}

export function tableRows(source: RowSource): TableRow[] {
  return [...placeRows(source), ...wallRows(source), ...centsRows(source)];
}

function placeRows({ document, unit, printLength }: RowSource): TableRow[] {
  const { footMm, mouthMm } = boreEnds(document);
  return [
    {
      key: 'position',
      label: 'From foot',
      unit,
      isMain: true,
      foot: printLength(0),
      editable: ({ hole }) => ({
        kind: 'length',
        value: fromFootMm(document, hole.positionMm),
        min: 1,
        max: footMm - Math.max(mouthMm, 0) - 1,
        isQuiet: false,
        edit: (before, value) =>
          changeHole(before, hole.id, { positionMm: typedPosition(before, fromFootMm(before, value)) }),
      }),
    },
    {
      key: 'diameter',
      label: 'Diameter',
      unit,
      isMain: true,
      foot: printLength(diameterAt(document.bore.stations, footMm)),
      editable: ({ hole }) => ({
        kind: 'length',
        value: hole.diameterMm,
        min: 0.5,
        max: widestHoleMm(document, hole.positionMm),
        isQuiet: false,
        edit: (before, diameterMm) => changeHole(before, hole.id, { diameterMm }),
      }),
    },
  ];
}

function wallRows({ document, unit, printLength }: RowSource): TableRow[] {
  return [
    {
      key: 'chimney',
      label: 'Chimney',
      unit,
      isMain: false,
      editable: ({ hole }) => ({
        kind: 'length',
        value: chimneyMm(document, hole),
        min: 0.1,
        max: 100,
        isQuiet: hole.chimneyMm === null,
        ...(hole.chimneyMm === null ? { quietText: printLength(chimneyMm(document, hole)) } : {}),
        edit: (before, value) => changeHole(before, hole.id, { chimneyMm: value }),
      }),
    },
    {
      key: 'undercut',
      label: 'Undercut to',
      unit,
      isMain: true,
      editable: ({ hole }) => ({
        kind: 'length',
        value: hole.undercut?.innerDiameterMm ?? hole.diameterMm,
        min: hole.diameterMm,
        max: Math.max(hole.diameterMm, widestHoleMm(document, hole.positionMm)),
        isQuiet: hole.undercut === null,
        ...(hole.undercut === null ? { quietText: '–' } : {}),
        edit: (before, value) => withUndercut(before, hole.id, value),
      }),
    },
    {
      key: 'angle',
      label: 'Angle',
      unit: 'deg',
      isMain: false,
      editable: ({ hole }) => ({
        kind: 'angle',
        value: hole.angleDeg,
        min: -LONGEST_ANGLE,
        max: LONGEST_ANGLE,
        isQuiet: hole.angleDeg === 0,
        edit: (before, angleDeg) => changeHole(before, hole.id, { angleDeg }),
      }),
    },
    {
      key: 'reach',
      label: 'Reach to next',
      unit,
      isMain: false,
      between: ({ hole }, next) => next.hole.positionMm - hole.positionMm,
    },
  ];
}

/** What is typed keeps its hundredths, but stays inside the bore. */
function typedPosition(document: DesignDocument, positionMm: number): number {
  const { mouthMm, footMm } = boreEnds(document);
  const isInside = positionMm > Math.max(mouthMm, 0) && positionMm < footMm;
  return isInside ? positionMm : snapPosition(document, positionMm);
}

function centsRows({ sensitivities, unit, selection, holes, notes }: RowSource): TableRow[] {
  const step = SENSITIVITY_STEP[unit];
  const short = step.label.replace(/ .*/, '');
  const cents = (column: string, dimension: 'diameterMm' | 'positionMm') => {
    const index = holes.find(({ hole }) => hole.id === column)?.index;
    const key = index === undefined ? `foot.${dimension}` : `holes.${index}.${dimension}`;
    const note = leadingNote(notes, column, selection);
    const value = centsPerStep(sensitivities, note?.fingering.id, key, step.mm);
    return value === null ? null : formatCents(value);
  };
  return [
    {
      key: 'wider',
      label: `Wider ${short}`,
      unit: 'cents',
      isMain: true,
      figure: (column) => (column === 'foot' ? null : cents(column, 'diameterMm')),
    },
    {
      key: 'footward',
      label: `Footward ${short}`,
      unit: 'cents',
      isMain: false,
      figure: (column) => cents(column, 'positionMm'),
    },
  ];
}
