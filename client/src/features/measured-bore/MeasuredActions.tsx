import { Button } from '../../ui/Button.tsx';
import { counted } from './measured-words.ts';
import type { MeasuredBoreDesk } from './use-measured-bore.ts';

/** What can be done with a measured bore: nothing, something later, or the one thing it was read in for. */
export function MeasuredActions({ desk }: { desk: MeasuredBoreDesk }) {
  const { proposed, refusals } = desk;
  const stations = proposed?.bore.stations.length ?? 0;
  return (
    <>
      <Button look="bare" onClick={desk.putBack}>
        Put it back
      </Button>
      <Button disabled={proposed === null} onClick={desk.closeBeside}>
        Keep beside the drawn bore
      </Button>
      <Button look="go" disabled={proposed === null || refusals.length > 0} onClick={desk.use}>
        {proposed === null ? 'Use these stations' : `Use these ${counted(stations, 'station')}`}
      </Button>
    </>
  );
}
