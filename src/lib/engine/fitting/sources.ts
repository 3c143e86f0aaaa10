// Titles named by several entries.
const IDELCHIK = 'Idelchik, Handbook of Hydraulic Resistance, 3rd ed.';
const SMACNA = 'SMACNA, HVAC Systems Duct Design, 4th ed. (2006)';

/** A diagram of Idelchik's handbook, which was read as other texts quote it. */
export const idelchik = (diagram: string): string => `${IDELCHIK}, diagram ${diagram}, read at second hand`;
export const SMACNA_ELBOWS = `${SMACNA}, table A-7`;
export const RENNELS = 'Rennels & Hudson, Pipe Flow (2012)';
export const RENNELS_METHOD = 'Rennels and Hudson';
export const MILLER = 'Miller, Internal Flow Systems, 2nd ed. (1990), charts read at second hand';
export const BLEVINS = 'Blevins, Applied Fluid Dynamics Handbook (1984), tables read at second hand';
/** Pages of the duct design book that were not at hand. */
export const SMACNA_MEMORY = 'SMACNA, HVAC Systems Duct Design, from memory';
