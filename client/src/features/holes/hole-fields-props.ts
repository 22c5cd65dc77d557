import type { LabelledHole } from '#shared/document/hole-labels.ts';
import type { PanelProps } from '../../bench/panel-props.ts';
import type { SuggestionDesk } from './use-suggestion-desk.ts';

export interface HoleFieldsProps extends PanelProps {
  chosen: LabelledHole;
  /** The fingering whose cents stand beside the sizes. */
  leading: string | undefined;
  suggestion: SuggestionDesk;
}
