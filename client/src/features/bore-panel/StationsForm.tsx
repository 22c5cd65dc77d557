import { DOCUMENT_LIMITS } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import type { ProfilePart } from '../../bench/end-edits.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import { Button } from '../../ui/Button.tsx';
import { lengthFormat } from '../../ui/length-format.ts';
import { NumberField } from '../../ui/NumberField.tsx';
import { Segment } from '../../ui/Segment.tsx';
import { changeStation, longestSpan, moveStation, removeStation, splitSpan } from './bore-edits.ts';
import { StationTable } from './StationTable.tsx';

interface StationsFormProps extends PanelProps {
  part: ProfilePart;
  onPart: (part: ProfilePart) => void;
  chosen: number | null;
  onChoose: (index: number | null) => void;
}

/** Stations of the bore or of the outside as a table, with the chosen one's sizes to type. */
export function StationsForm(props: StationsFormProps) {
  const { document, unit, part, onPart, chosen, onChoose, onEdit, readOnly } = props;
  const { stations } = document[part];
  const isFull = stations.length >= DOCUMENT_LIMITS.stations;
  const add = () => {
    const at = chosen ?? longestSpan(stations);
    onEdit({ label: 'Add a station', change: (before) => splitSpan(before, part, at).document });
    onChoose(splitSpan(document, part, at).index);
  };
  return (
    <section aria-labelledby="stations-heading">
      <div className="flex items-center justify-between gap-2">
        <h2 id="stations-heading" className="text-section font-semibold">
          Stations{' '}
          <span className="text-data text-ink3 ml-1 font-normal">{unit === 'mm' ? 'mm' : 'inch'}</span>
        </h2>
        <Segment
          label="Stations of"
          size="small"
          value={part}
          options={[
            { value: 'bore', label: 'bore' },
            { value: 'outside', label: 'outside' },
          ]}
          onChange={onPart}
        />
      </div>
      <StationTable document={document} part={part} unit={unit} chosen={chosen} onChoose={onChoose} />
      {chosen !== null && stations[chosen] !== undefined && (
        <StationFields {...props} index={chosen} isFixed={part === 'bore' && chosen === 0} />
      )}
      {readOnly === null && (
        <div className="mt-2 flex flex-wrap gap-2">
          <Button size="small" onClick={add} disabled={isFull}>
            Add a station
          </Button>
          {chosen !== null && stations.length > 2 && chosen > 0 && chosen < stations.length - 1 && (
            <Button
              size="small"
              look="bare"
              onClick={() => {
                onEdit({
                  label: 'Remove a station',
                  change: (before) => removeStation(before, part, chosen),
                });
                onChoose(null);
              }}
            >
              Remove station {chosen + 1}
            </Button>
          )}
        </div>
      )}
    </section>
  );
}

interface StationFieldsProps extends StationsFormProps {
  index: number;
  /** The mouth end says where the bore begins. */
  isFixed: boolean;
}

function StationFields({ document, unit, part, index, isFixed, readOnly, onEdit }: StationFieldsProps) {
  const station = document[part].stations[index];
  if (station === undefined) return null;
  const { footMm } = boreEnds(document);
  const isFoot = part === 'bore' && index === document.bore.stations.length - 1;
  const key = (field: string) => `${part}.stations.${index}.${field}`;
  return (
    <div
      role="group"
      aria-label={`Station ${index + 1}`}
      className="border-hair mt-2 flex flex-col gap-2 border-t pt-2"
    >
      {isFixed || isFoot ? (
        <p className="text-data text-ink3">
          {isFixed ? 'The bore begins where the mouth end says.' : 'The foot. Its place is the length below.'}
        </p>
      ) : (
        <NumberField
          layout="row"
          label="From foot"
          value={footMm - station.positionMm}
          format={lengthFormat(unit)}
          disabled={readOnly !== null}
          onChange={(fromFoot) =>
            onEdit({
              label: `Move station ${index + 1}`,
              change: (before) =>
                moveStation(before, part, index, { ...station, positionMm: footMm - fromFoot }),
              mergeKey: key('positionMm'),
            })
          }
        />
      )}
      <NumberField
        layout="row"
        label="Diameter"
        value={station.diameterMm}
        format={lengthFormat(unit, unit === 'mm' ? 0.05 : undefined)}
        min={0.1}
        max={500}
        disabled={readOnly !== null}
        onChange={(diameterMm) =>
          onEdit({
            label: `Width of station ${index + 1}`,
            change: (before) => changeStation(before, part, index, { diameterMm }),
            mergeKey: key('diameterMm'),
          })
        }
      />
    </div>
  );
}
