import type { DesignPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import { formatCents } from '#shared/music/cents.ts';
import { ColumnFigures, type FigureRow } from '../../bench/ColumnFigures.tsx';
import { hungNotes } from '../../bench/hung-notes.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { movedCents, noteMoves, printWidth } from './measured-words.ts';

interface MeasuredTableProps extends Pick<PanelProps, 'document' | 'geometry' | 'unit' | 'selection'> {
  proposed: DesignDocument;
  drawn: DesignPrediction | null;
  measured: DesignPrediction | null;
}

/** Bore as drawn and as measured at every hole, and how far it moves the notes that hang there. */
export function MeasuredTable({ geometry, selection, ...props }: MeasuredTableProps) {
  return (
    <ColumnFigures
      label="Drawn and measured bore at the holes"
      geometry={geometry}
      selection={selection}
      holes={labelledHoles(props.document)}
      rows={[...widthRows(props), ...moveRows(props)]}
    />
  );
}

type RowSource = Omit<MeasuredTableProps, 'geometry' | 'selection'>;

function widthRows({ document, proposed, unit }: RowSource): FigureRow[] {
  const placeOf = (key: string) =>
    document.holes.find(({ id }) => id === key)?.positionMm ?? boreEnds(document).footMm;
  const drawnAt = (key: string) => diameterAt(document.bore.stations, placeOf(key));
  const measuredAt = (key: string) => diameterAt(proposed.bore.stations, placeOf(key));
  const signed = (mm: number) => {
    const text = printWidth(mm, unit);
    return mm > 0 && Number(text) !== 0 ? `+${text}` : text;
  };
  const [label, digits] = unit === 'mm' ? ['mm', 1] : ['in', 3];
  return [
    {
      label: 'From foot',
      unit: label,
      figure: (key) => printLength(boreEnds(document).footMm - placeOf(key), unit, digits),
    },
    { label: 'Bore drawn', unit: label, look: 'quiet', figure: (key) => printWidth(drawnAt(key), unit) },
    {
      label: 'Bore measured',
      unit: label,
      look: 'strong',
      figure: (key) => printWidth(measuredAt(key), unit),
    },
    { label: 'Wider by', unit: label, figure: (key) => signed(measuredAt(key) - drawnAt(key)) },
  ];
}

function moveRows({ document, drawn, measured }: RowSource): FigureRow[] {
  const moves = noteMoves(document, drawn, measured);
  const hung = hungNotes(document, drawn).filter(({ row }) => row === 'register');
  const registers = [...new Set(hung.map(({ fingering }) => fingering.register))].sort((a, b) => a - b);
  return registers.map((register) => ({
    label: `Moves register ${register}`,
    unit: 'cents',
    figure: (key) => {
      const note = hung.find(({ column, fingering }) => column === key && fingering.register === register);
      if (note === undefined) return '';
      const move = moves.find(({ fingering }) => fingering === note.fingering.id);
      const by = move === undefined ? null : movedCents(move);
      return by === null ? '–' : formatCents(by);
    },
  }));
}
