import { useState, type ReactNode } from 'react';
import type { Station } from '#shared/document/design-document.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { classNames } from '../../ui/class-names.ts';
import type { ProfilePart } from '../../bench/end-edits.ts';
import { BoreShelf } from './BoreShelf.tsx';
import { BoreTable } from './BoreTable.tsx';
import { FootForm } from './FootForm.tsx';
import { MouthForm } from './MouthForm.tsx';
import { StationsForm } from './StationsForm.tsx';
import './bore-panel.css';

interface BorePanelProps extends PanelProps {
  /** What hangs under the holes: handed in by the page. */
  hang?: ReactNode;
  /** What a measured bore has to say above the stations: handed in by the page. */
  note?: ReactNode;
  /** A second line over the drawn bore. */
  beside?: readonly Station[] | null;
}

/** Bore, outside, mouth end and foot: the wall across the shelf, its figures at the left, what it does under the holes. */
export function BorePanel({ hang, note, ...props }: BorePanelProps) {
  const [part, setPart] = useState<ProfilePart>('bore');
  const [chosen, setChosen] = useState<number | null>(null);
  const { layout, measures } = props.geometry;
  const isWide = layout === 'wide';
  const isBeside = isWide || layout === 'tablet';
  const choosePart = (next: ProfilePart) => {
    setPart(next);
    setChosen(null);
  };
  return (
    <section aria-label="Bore">
      <BoreShelf
        {...props}
        chosen={part === 'bore' ? chosen : null}
        onChoose={(index) => {
          setPart('bore');
          setChosen(index);
        }}
      />
      <div className={classNames('grid', !isWide && 'pb-18')}>
        <div
          className={classNames(
            'z-10 pt-2 pb-6',
            isBeside && 'col-start-1 row-start-1',
            isWide && 'flex items-start gap-5',
          )}
          style={{
            marginLeft: measures.leftZone.x,
            ...(isBeside
              ? { width: isWide ? 512 : measures.leftZone.width }
              : { marginRight: measures.leftZone.x }),
          }}
        >
          <div className={classNames(isWide && 'w-74 shrink-0')}>
            {note}
            <StationsForm {...props} part={part} onPart={choosePart} chosen={chosen} onChoose={setChosen} />
            <FootForm {...props} />
          </div>
          <MouthForm {...props} />
        </div>
        <div className={classNames(isBeside && 'col-start-1 row-start-1')}>
          {hang}
          <BoreTable {...props} />
        </div>
      </div>
    </section>
  );
}
