interface ZoomButtonsProps {
  isWhole: boolean;
  onZoom: (factor: number) => void;
  onWhole: () => void;
  onHoles: () => void;
}

const BUTTON =
  'border-line bg-sheet text-ink2 hover:text-ink disabled:text-line flex size-7 items-center justify-center pointer-coarse:size-11 border text-[17px] leading-none';

/** Nearer, further, the finger holes, the whole: in the margin right of the foot. */
export function ZoomButtons({ isWhole, onZoom, onWhole, onHoles }: ZoomButtonsProps) {
  return (
    <div role="group" aria-label="Zoom" className="absolute top-16 right-3.5 flex flex-col -space-y-px">
      <button
        type="button"
        aria-label="Zoom in"
        className={`${BUTTON} rounded-t-control`}
        onClick={() => onZoom(1.4)}
      >
        +
      </button>
      <button
        type="button"
        aria-label="Zoom out"
        disabled={isWhole}
        className={BUTTON}
        onClick={() => onZoom(1 / 1.4)}
      >
        −
      </button>
      <button
        type="button"
        aria-label={isWhole ? 'Zoom to the finger holes' : 'Show the whole instrument'}
        className={`${BUTTON} rounded-b-control`}
        onClick={isWhole ? onHoles : onWhole}
      >
        <svg width="16" height="12" viewBox="0 0 16 12" aria-hidden="true" fill="none" stroke="currentColor">
          {isWhole ? (
            <path d="M1 6h14M5 2.5L1 6l4 3.5M11 2.5L15 6l-4 3.5" strokeWidth="1.4" />
          ) : (
            <path d="M.7 2.7h14.6v6.6H.7zM5 6h.1M8 6h.1M11 6h.1" strokeWidth="1.4" strokeLinecap="round" />
          )}
        </svg>
      </button>
    </div>
  );
}
