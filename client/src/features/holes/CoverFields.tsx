import { titleInSentence } from '#shared/document/title-in-sentence.ts';

import { memo, useId } from 'react';
import { COVERS, type ToneHole } from '#shared/document/design-document.ts';
import type { DesignEdit } from '../../bench/panel-props.ts';
import { changeHole } from '../../bench/hole-edits.ts';
import { classNames } from '../../ui/class-names.ts';
import { COVER_WORDS, HAND_WORDS, withCover } from './inspector-fields.ts';

interface CoverFieldsProps {
  holeId: string;
  cover: ToneHole['cover'];
  hand: ToneHole['hand'];
  title: string;
  disabled: boolean;
  onEdit: (edit: DesignEdit) => void;
}

const SELECT =
  'border-line bg-sheet rounded-control text-data disabled:border-hair h-8 min-w-0 border px-2 disabled:bg-transparent max-[1279px]:h-12';

/** What covers the hole, and which hand. */
export const CoverFields = memo(function CoverFields(props: CoverFieldsProps) {
  const { holeId, title, disabled, onEdit } = props;
  const id = useId();
  return (
    <div className="border-hair flex items-center gap-2 border-t py-2">
      <label htmlFor={id} className="w-14 shrink-0">
        Cover
      </label>
      <select
        id={id}
        disabled={disabled}
        value={props.cover}
        className={classNames(SELECT, 'flex-1')}
        onChange={(event) => {
          const cover = COVERS.find((each) => each === event.currentTarget.value);
          if (cover === undefined) return;
          onEdit({
            label: `Cover of ${titleInSentence(title)}`,
            change: (before) => withCover(before, holeId, cover),
          });
        }}
      >
        {COVERS.map((cover) => (
          <option key={cover} value={cover}>
            {COVER_WORDS[cover]}
          </option>
        ))}
      </select>
      <select
        aria-label="Hand"
        disabled={disabled}
        value={props.hand}
        className={classNames(SELECT, 'w-26')}
        onChange={(event) => {
          const hand = event.currentTarget.value === 'right' ? 'right' : 'left';
          onEdit({
            label: `Hand of ${titleInSentence(title)}`,
            change: (before) => changeHole(before, holeId, { hand }),
          });
        }}
      >
        <option value="left">{HAND_WORDS.left}</option>
        <option value="right">{HAND_WORDS.right}</option>
      </select>
    </div>
  );
});
