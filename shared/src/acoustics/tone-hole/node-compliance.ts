/**
 * Compliance of the air where an open tone hole meets the bore, as a length over the hole's radius at the bore; no unit.
 *
 * An admittance j·k·ratio·holeRadius over the hole's characteristic impedance, across the bore at the hole, open holes
 * only. Fitted to three-dimensional finite elements, see tests/reference/tables/tonehole.json.
 */
export const NODE_COMPLIANCE_RATIO = 0.11;
