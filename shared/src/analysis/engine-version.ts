/** Name and version of the engine; goes up whenever a figure it gives may change. */
export const ENGINE = 'borewright 1.0.0';
