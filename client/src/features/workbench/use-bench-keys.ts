import { useEffect, useRef } from 'react';
import { isSingleKey } from '../../ui/single-key.ts';

/** What the keys of the bench do; the page says how. */
export interface BenchCommands {
  chooseNumber: (number: number) => void;
  chooseEnd: (end: 'foot' | 'mouth') => void;
  chooseThumb: () => void;
  stepHole: (by: 1 | -1) => void;
  nudge: (steps: number) => void;
  changeDrill: (by: 1 | -1, byTenth: boolean) => void;
  stepNote: (by: 1 | -1) => void;
  nextRegister: () => void;
  stepPanel: (by: 1 | -1) => void;
  undo: () => void;
  redo: () => void;
  fullLadder: () => void;
  playReference: () => void;
  trySuggestion: () => void;
  putBack: () => void;
  removeHole: () => void;
  zoom: (factor: number) => void;
}

/** Two figures within this time make one number, ms. */
const TWO_FIGURES_MS = 600;
/** Shift makes a step this much longer. */
const LONG_STEP = 5;

/** The keys of the workbench. Single keys rest while something is typed; with Alt or Ctrl they work everywhere. */
export function useBenchKeys(commands: BenchCommands): void {
  const latest = useRef(commands);
  useEffect(() => {
    latest.current = commands;
  });
  useEffect(() => {
    const digits = { text: '', at: 0 };
    const onKey = (event: KeyboardEvent) => {
      if (event.defaultPrevented) return;
      const done =
        withCtrl(event, latest.current) ||
        withAlt(event, latest.current) ||
        single(event, latest.current, digits);
      if (done) event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, []);
}

function withCtrl(event: KeyboardEvent, commands: BenchCommands): boolean {
  if (!(event.ctrlKey || event.metaKey) || event.altKey) return false;
  const key = event.key.toLowerCase();
  // A field that is being typed in has its own undo.
  if (event.target instanceof HTMLTextAreaElement) return false;
  if (key === 'z') {
    if (event.shiftKey) commands.redo();
    else commands.undo();
    return true;
  }
  if (key !== 'y') return false;
  commands.redo();
  return true;
}

function withAlt(event: KeyboardEvent, commands: BenchCommands): boolean {
  if (!event.altKey || event.ctrlKey || event.metaKey) return false;
  const along = { ArrowLeft: -1, ArrowRight: 1 }[event.key];
  if (along !== undefined) {
    commands.nudge(along * (event.shiftKey ? LONG_STEP : 1));
    return true;
  }
  const wider = event.key === 'ArrowUp' ? 1 : event.key === 'ArrowDown' ? -1 : null;
  if (wider === null) return false;
  commands.changeDrill(wider, event.shiftKey);
  return true;
}

/** Keys that stand for one command each. */
const SINGLE: Record<string, (commands: BenchCommands) => void> = {
  '0': (commands) => commands.chooseEnd('foot'),
  w: (commands) => commands.chooseEnd('mouth'),
  h: (commands) => commands.chooseThumb(),
  ArrowLeft: (commands) => commands.stepHole(-1),
  ArrowRight: (commands) => commands.stepHole(1),
  n: (commands) => commands.stepNote(1),
  N: (commands) => commands.stepNote(-1),
  r: (commands) => commands.nextRegister(),
  l: (commands) => commands.fullLadder(),
  ' ': (commands) => commands.playReference(),
  t: (commands) => commands.trySuggestion(),
  '[': (commands) => commands.stepPanel(-1),
  ']': (commands) => commands.stepPanel(1),
  Delete: (commands) => commands.removeHole(),
  Escape: (commands) => commands.putBack(),
  '+': (commands) => commands.zoom(1.25),
  '-': (commands) => commands.zoom(0.8),
  '=': (commands) => commands.zoom(0),
};

/** Arrows belong to what has the focus where that moves by arrows itself. */
const OWN_ARROWS =
  '[role="menu"], [role="listbox"], [role="table"], [role="radiogroup"], select, [role="slider"]';

interface Digits {
  text: string;
  at: number;
}

function single(event: KeyboardEvent, commands: BenchCommands, digits: Digits): boolean {
  if (!isSingleKey(event, event.key) || isOwnArrow(event) || isOwnSpace(event)) return false;
  if (/^\d$/.test(event.key) && takeDigit(event, commands, digits)) return true;
  const command = SINGLE[event.key] ?? SINGLE[event.key.toLowerCase()];
  if (command === undefined) return false;
  command(commands);
  return true;
}

function isOwnArrow({ key, target }: KeyboardEvent): boolean {
  return key.startsWith('Arrow') && target instanceof Element && target.closest(OWN_ARROWS) !== null;
}

/** The space bar presses what has the focus, unless that is what is chosen already: then it would do nothing. */
function isOwnSpace({ key, target }: KeyboardEvent): boolean {
  if (key !== ' ' || !(target instanceof Element)) return false;
  const control = target.closest('button, a, summary, [role="button"], [role="switch"], [role="tab"]');
  if (control === null) return false;
  const isChosen = control.getAttribute('aria-pressed') === 'true' && control.closest('[data-zone]') !== null;
  return !isChosen;
}

/** A second figure soon after the first makes a number of two; a 0 by itself is the foot. */
function takeDigit(event: KeyboardEvent, commands: BenchCommands, digits: Digits): boolean {
  const isSecond = digits.text !== '' && event.timeStamp - digits.at < TWO_FIGURES_MS;
  if (!isSecond && event.key === '0') return false;
  const text = isSecond ? digits.text + event.key : event.key;
  digits.text = isSecond ? '' : text;
  digits.at = event.timeStamp;
  commands.chooseNumber(Number(text));
  return true;
}
