// Titles named by several entries.
const IDELCHIK = 'Idelchik, Handbook of Hydraulic Resistance, 3rd ed.';
const SMACNA = 'SMACNA, HVAC Systems Duct Design, 4th ed. (2006)';

/** A diagram of Idelchik's handbook, which was read as other texts quote it. */
export const idelchik = (diagram: string): string => `${IDELCHIK}, diagram ${diagram}, read at second hand`;
export const SMACNA_ELBOWS = `${SMACNA}, table A-7`;
export const RENNELS = 'Rennels & Hudson, Pipe Flow (2012)';
