import { Link } from 'react-router';
import { Button } from '../../ui/Button.tsx';

interface ChoosingBandProps {
  /** The design that is to be held against another; null while that is to be chosen, too. */
  name: string | null;
  /** At another pitch or temperature a design is compared with itself; null until one is chosen. */
  selfTo: { pitch: string; air: string } | null;
  leaveTo: string;
}

/** Stands over the rack while designs are chosen from it to be compared. */
export function ChoosingBand({ name, selfTo, leaveTo }: ChoosingBandProps) {
  return (
    <div
      role="status"
      className="bg-mark-soft rounded-control mt-3 flex flex-wrap items-center gap-x-4 gap-y-2 px-4 py-2"
    >
      <p className="mr-auto">
        {name === null ? (
          <>Choose the first of the two designs to compare.</>
        ) : (
          <>
            Choose what to hold <b className="font-semibold">{name}</b> against.
          </>
        )}
      </p>
      {selfTo !== null && (
        <>
          <Button asChild size="small">
            <Link to={selfTo.pitch}>At another pitch</Link>
          </Button>
          <Button asChild size="small">
            <Link to={selfTo.air}>At another temperature</Link>
          </Button>
        </>
      )}
      <Button asChild size="small" look="bare">
        <Link to={leaveTo}>Leave it</Link>
      </Button>
    </div>
  );
}
