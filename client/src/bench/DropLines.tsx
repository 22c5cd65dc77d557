import type { PanelProps } from './panel-props.ts';

interface DropLinesProps extends Pick<PanelProps, 'document' | 'geometry' | 'selection'> {
  height: number;
}

/** From every hole down through a shelf. */
export function DropLines({ document, geometry, selection, height }: DropLinesProps) {
  return (
    <g aria-hidden="true">
      {document.holes.map(({ id, positionMm }) => {
        const x = geometry.x(positionMm);
        return x < geometry.viewLeft || x > geometry.viewRight ? null : (
          <line
            key={id}
            x1={x}
            x2={x}
            y2={height}
            className={id === selection.hole ? 'bench-drop is-chosen' : 'bench-drop'}
          />
        );
      })}
    </g>
  );
}
