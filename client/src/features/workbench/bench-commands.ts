import { titleInSentence } from '#shared/document/title-in-sentence.ts';
import type { DesignDocument, ToneHole } from '#shared/document/design-document.ts';
import { nearestDrills } from '#shared/lengths/drills.ts';
import { moveMouthEnd, trimFoot } from '../../bench/end-edits.ts';
import { drillsFor } from '../../bench/drill-choice.ts';
import { changeHole, removeHole, snapPosition, widestHoleMm } from '../../bench/hole-edits.ts';
import { labelledHoles } from '#shared/document/hole-labels.ts';
import { SENSITIVITY_STEP } from '../../bench/hole-sensitivity.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { BenchCommands } from './use-bench-keys.ts';

type Commands = Pick<
  BenchCommands,
  | 'chooseNumber'
  | 'chooseEnd'
  | 'chooseThumb'
  | 'stepHole'
  | 'nudge'
  | 'changeDrill'
  | 'stepNote'
  | 'nextRegister'
  | 'removeHole'
>;

/** What the keys do to the choice and to the chosen hole. */
export function benchCommands(props: PanelProps): Commands {
  const { document, selection, onSelect } = props;
  const holes = labelledHoles(document);
  const at = holes.findIndex(({ hole }) => hole.id === selection.hole);
  const choose = (hole: ToneHole | undefined) => hole !== undefined && onSelect({ hole: hole.id });
  return {
    chooseNumber: (number) => {
      const fingers = holes.filter(({ hole }) => hole.cover !== 'thumb' && hole.cover !== 'vent');
      choose((holes.find(({ label }) => label === String(number)) ?? fingers[number - 1])?.hole);
    },
    chooseEnd: (end) => onSelect({ hole: end }),
    chooseThumb: () => choose(holes.find(({ hole }) => hole.cover === 'thumb')?.hole),
    stepHole: (by) => {
      const next = at < 0 ? (by > 0 ? holes[0] : holes.at(-1)) : holes[at + by];
      choose(next?.hole);
    },
    stepNote: (by) => {
      const { fingerings } = document;
      const present = fingerings.findIndex(({ id }) => id === selection.fingering);
      const next = fingerings[(present + by + fingerings.length) % Math.max(1, fingerings.length)];
      if (next !== undefined) onSelect({ fingering: next.id });
    },
    nextRegister: () => onSelect({ register: nextRegister(document, selection.register) }),
    ...holeCommands(props),
  };
}

function holeCommands(props: PanelProps): Pick<Commands, 'nudge' | 'changeDrill' | 'removeHole'> {
  const { document, selection, unit, readOnly, onEdit, onSelect } = props;
  const chosen = labelledHoles(document).find((labelled) => labelled.hole.id === selection.hole);
  const nothing = () => undefined;
  if (chosen === undefined || readOnly !== null)
    return {
      nudge: readOnly === null ? nudgeEnd(props) : nothing,
      changeDrill: nothing,
      removeHole: nothing,
    };
  const { hole } = chosen;
  const title = titleInSentence(chosen.title);
  return {
    nudge: (steps) =>
      onEdit({
        label: `Move ${title}`,
        change: (before) =>
          changeHole(before, hole.id, {
            positionMm: snapPosition(before, hole.positionMm + steps * SENSITIVITY_STEP[unit].mm),
          }),
        mergeKey: `nudge-${hole.id}`,
      }),
    changeDrill: (by, byTenth) => {
      const diameterMm = nextDiameter(props, hole, byTenth ? by / 10 : by);
      if (diameterMm === null) return;
      onEdit({
        label: `Drill size of ${title}`,
        change: (before) => changeHole(before, hole.id, { diameterMm }),
        mergeKey: `drill-${hole.id}`,
      });
    },
    removeHole: () => {
      onEdit({ label: `Take away ${title}`, change: (before) => removeHole(before, hole.id) });
      onSelect({ hole: null });
    },
  };
}

/** Moves the chosen end along the instrument by steps, as its grip does. */
function nudgeEnd({ selection, unit, onEdit }: PanelProps): Commands['nudge'] {
  const end = selection.hole;
  return (steps) => {
    if (end !== 'mouth' && end !== 'foot') return;
    const byMm = steps * SENSITIVITY_STEP[unit].mm;
    onEdit({
      label: `Move the ${end === 'foot' ? 'foot' : 'mouth end'}`,
      change: (before) => (end === 'mouth' ? moveMouthEnd(before, byMm) : trimFoot(before, byMm)),
      mergeKey: `nudge-${end}`,
    });
  };
}

/** Whole steps go from drill to drill, others by themselves in mm; null where the bore or the drills end. */
function nextDiameter({ document, unit }: PanelProps, hole: ToneHole, step: number): number | null {
  const widest = widestHoleMm(document, hole.positionMm);
  const drills = drillsFor(unit).filter((drill) => unit === 'inch' || isHalf(drill.diameterMm));
  const { narrower, wider } = nearestDrills(hole.diameterMm, drills);
  const next = Number.isInteger(step)
    ? (step > 0 ? wider : narrower)?.diameterMm
    : Math.round((hole.diameterMm + step) * 1000) / 1000;
  return next === undefined || next > widest + 1e-9 || next < 0.5 ? null : next;
}

const isHalf = (mm: number) => Math.abs(mm * 2 - Math.round(mm * 2)) < 1e-6;

function nextRegister(document: DesignDocument, present: number | 'all'): number | 'all' {
  const registers = [...new Set(document.fingerings.map(({ register }) => register))].sort((a, b) => a - b);
  const index = present === 'all' ? -1 : registers.indexOf(present);
  return registers[index + 1] ?? 'all';
}
