/** Titles of what the checks rest on: read as excerpts, so that an edition is confirmed before it is quoted. */
export const VA = 'HVAC Design Manual, November 2017, Table 3-3, U.S. Department of Veterans Affairs';
export const VA_EXHAUST = 'HVAC Design Manual, November 2017, section 3.8, U.S. Department of Veterans Affairs';
export const VA_OLDER = 'HVAC design manual for hospitals, an older edition, U.S. Department of Veterans Affairs';
export const VA_CEMETERY = 'Design Guide, June 1999, section 2.6, National Cemetery Administration';
export const MIL_AIR = 'MIL-HDBK-1003/3, section 6, U.S. Department of Defense';
export const MIL_MEDICAL = 'MIL-HDBK-1191, section 8.11, U.S. Department of Defense';
export const NAVY = 'Architect-Engineer guide, section 13.3.2, Naval Facilities Engineering Command';
export const NAVY_DUCTS = 'Architect-Engineer guide, mechanical calculations, Naval Facilities Engineering Command';
export const UFGS = 'UFGS 15950N, note on duct air leak testing, U.S. unified facilities guide specifications';
export const LBL_ELBOWS =
	'Design guide for energy-efficient research laboratories, “Elbows”, Lawrence Berkeley National Laboratory';
export const LBNL_LEAKAGE =
	'Rationale for Measuring Duct Leakage Flows in Large Commercial Buildings, Lawrence Berkeley National Laboratory';
export const SMACNA_DESIGN = 'HVAC Systems – Duct Design, chapter on sound, SMACNA';
export const FLEXIBLE_TESTS = 'Compression Effects on Pressure Loss in Flexible HVAC Ducts, 2004';
export const FLEXIBLE_CODE = 'The Building Code Forum, thread on IMC 603.6';
export const FLEXIBLE_PRACTICE = 'Predicting the Performance of Flexible-Duct Systems, HPAC Engineering';
export const AIR_NOISE = 'HVAC Air Noise, a trade training page';
export const DIFFUSER_SOUND = 'Diffuser sound, Sheet Metal Journal';
export const FAN_TEXTBOOK = 'An air-conditioning textbook, chapter on fans (its title from memory)';
export const FAN_REVIEW = 'Fan submittal review, Engineered Systems magazine';
export const FAN_STORY = 'Finding the Right Equipment, HPAC Engineering';
export const FAN_MOUNTING = 'Mounting recommendations of a fan maker';
export const REGAIN_REVIEW = 'A review of “Equal Friction Solution for Duct Sizing”';
export const INDEX_NOTE = 'External static pressure method note, a ventilation blog';
export const TRAVERSE = 'Duct traverse, tips of a balance firm';
export const TOLERANCE = '“+/- 10 %?”, an article on tolerances that quotes CIBSE';
export const DAMPER_RATING = 'A note on ratings of fire and smoke dampers';
export const RATED_WALLS = 'A series of talks on IMC section 607';
export const LABORATORIES = 'Laboratory design guidelines of a university';
export const ROOM_PRESSURE = 'Room Pressure for Critical Environments, ASHRAE Journal, February 2003';
export const LABORATORY_CODE = 'NFPA 45, as practitioners quote it';
export const GREASE_VELOCITY = 'New Rules for Kitchen Exhaust, abstract, ASHRAE Journal';
export const GREASE_BUILD = 'A column on kitchen exhaust, Engineered Systems magazine';
