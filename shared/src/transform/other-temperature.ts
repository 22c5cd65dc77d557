import type { DesignDocument } from '../document/design-document.ts';

/** The same instrument in air of another temperature; a column warmed by the breath keeps what it is warmed to at the mouth. */
export function atTemperature(document: DesignDocument, temperatureC: number): DesignDocument {
  return { ...document, air: { ...document.air, temperatureC } };
}
