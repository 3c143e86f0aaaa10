/** What was tried, where, and what was answered. */
import type { RowField, SettingField } from '$lib/sheet/sheet';
import type { TypedRow } from './any-sheet';

export const MAIN: TypedRow = { tag: 'S01', size: '400x300', length: '5' };
export const GOOD: TypedRow = { tag: 'S02', joins: 'S01', size: 'Ø200', length: '4', flow: '100', outlet: '10' };
export const TRIED: TypedRow = { tag: 'S03', joins: 'S01', size: 'Ø160', length: '9', flow: '60', outlet: '16' };
const A_SIZE = 'a size, such as 600x350, ø200, oval 510x255 or 12"';
const A_LENGTH = 'a length, such as 6.5, 6.5 m or 6500 mm';
const A_CLASS = 'A, B, C or D, ATC 1 to ATC 6, or an inch-pound class such as CL 24; none for tight ductwork';
const A_LINING = 'a thickness, such as 25 or 25 metal';
const A_FLOW = 'a flow, such as 200, 200 L/s or 720 m³/h';

type Answer = readonly [tried: string, field: RowField, typed: string, message: string, expected: string];

export const BAD_CELLS: readonly Answer[] = [
	['a size with a figure missing', 'size', '24xx12', '“24xx12”: a figure of the size is missing.', A_SIZE],
	['a size of zero', 'size', '0x300', '“0x300”: a duct cannot have a size of zero.', A_SIZE],
	['a size that no duct has', 'size', '0.5', '“0.5”: 0.5 mm is too small for a duct (least 10 mm).', A_SIZE],
	['a size of three figures', 'size', '600x300x200', '“600x300x200”: a size has one figure or two.', A_SIZE],
	['a size in pascal', 'size', '5 Pa', '“5 Pa”: “pa” is not understood.', A_SIZE],
	['a negative length', 'length', '-3', '“-3”: a length cannot be negative.', A_LENGTH],
	['a length in kilograms', 'length', '3 kg', '“3 kg”: kg is not a unit of a length.', A_LENGTH],
	['a length that is no number', 'length', 'NaN', '“NaN” is not a figure.', A_LENGTH],
	['a length without end', 'length', 'Infinity', '“Infinity” is not a figure.', A_LENGTH],
	['a length of too many digits', 'length', '1e999', '“1e999”: too great for a length (most 10\u2009000 m).', A_LENGTH],
	['a sum that divides by zero', 'length', '=3/0', '“=3/0”: the sum divides by zero.', A_LENGTH],
	['a sum without its sign', 'length', '3+4', '“3+4”: a sum starts with an equals sign.', A_LENGTH],
	['a flow of zero', 'flow', '0', '“0”: an outlet without a flow moves no air.', 'a flow above zero, such as 200 L/s'],
	['a negative flow', 'flow', '-5', '“-5”: a flow cannot be negative.', A_FLOW],
	['a flow in metres', 'flow', '5 m', '“5 m”: m is not a unit of a flow.', A_FLOW],
	[
		'an outlet’s loss in words',
		'outlet',
		'lots',
		'“lots” is not a figure.',
		'a pressure, such as 25, 25 Pa or 0.1 in wg, “open”, or a word before it, such as grille 25 Pa or louvre C 1.2'
	],
	[
		'a side that is none',
		'side',
		'sideways',
		'“sideways” is none of the choices here.',
		'Supply, Return, Exhaust, Outdoor'
	],
	[
		'another direction of the air than the row it joins',
		'side',
		'exhaust',
		'Air cannot run toward the fan and away from it in one run.',
		'supply, as the row it joins'
	],
	['a row that joins itself', 'joins', 'S03', 'S03 joins itself.', 'another row, or a blank where it meets the fan'],
	['a tag that no row has', 'joins', 'S99', 'No row has the tag S99.', 'the tag of the row on the fan’s side'],
	['a tag in small letters', 'joins', 's01', 'No row has the tag s01.', 'S01, as that row has it'],
	['a tag too long to print', 'tag', 'x'.repeat(41), 'This tag has 41 characters.', 'at most 40'],
	['no tag', 'tag', '', 'This row has no tag.', 'a tag of its own, as S01'],
	['no size', 'size', '', 'This row has no size.', 'a size, as 600x300 or Ø250'],
	['no length', 'length', '', 'This row has no length.', 'the length on the centre line; 0 for none'],
	[
		'no flow at the end of a run',
		'flow',
		'',
		'Nothing joins S03, so it needs an outlet.',
		'the flow of its outlet, or a row that joins it'
	],
	[
		'a part that is none',
		'parts',
		'elbw',
		'“elbw” is not a known part.',
		'known words nearest to it: elbow, elbows, ell'
	],
	[
		'a junction without its stream',
		'parts',
		'tee',
		'“tee”: a junction needs to know which stream this row is, or its coefficient C.',
		'tee branch, tee straight, or tee C0.8'
	],
	[
		'equipment without its loss',
		'parts',
		'silencer',
		'“silencer”: its coefficient or its pressure is missing: what the maker states at the design flow, or C.',
		'silencer 25 Pa, or silencer C0.6'
	],
	[
		'equipment with a figure of no unit',
		'parts',
		'silencer 25',
		'“25” is a figure without a sign.',
		'25 Pa for a pressure, or C25 for a coefficient'
	],
	[
		'equipment that gives pressure',
		'parts',
		'silencer -25 Pa',
		'“silencer -25 Pa”: a pressure cannot be negative.',
		'a pressure, such as 25, 25 Pa or 0.1 in wg'
	],
	[
		'a coefficient that is none',
		'parts',
		'elbow C99999999',
		'“elbow C99999999”: the coefficient is too great.',
		'at most 1000000, such as C0.23'
	],
	[
		'a method of nobody',
		'parts',
		'elbow by smith',
		'“elbow by smith”: the catalogue has no method by smith.',
		'one of Bassett; Blevins; Crane; Gardel; Idelchik; Idelchik, equation; Idelchik, table; Ito; Miller; Rennels; SMACNA'
	],
	[
		'a method that another fitting has',
		'parts',
		'elbow by crane',
		'Elbow has no method by Crane.',
		'by Idelchik; by SMACNA; by Rennels; by Miller; by Ito'
	],
	[
		'a transition at a leg of a junction',
		'parts',
		'tee branch; reducer',
		'Reducer: its coefficient C, or its kind, is missing: the size of the junction’s leg is not on the sheet.',
		'transition C0.1; or gradual contraction a0.5 20°, or gradual expansion a0.5 20°'
	],
	[
		'a louvre without its maker’s figure',
		'parts',
		'intake louvre',
		'“intake louvre”: its coefficient or its pressure is missing: what the maker states.',
		'intake louvre C1.2, or intake louvre 25 Pa'
	],
	[
		'a hood that may let in or out',
		'parts',
		'exhaust hood',
		'“exhaust hood”: does a hood take the air in or let it out.',
		'hood, flanged hood or tapered hood 45° where it takes air in; exhaust cowl C1.2 where it lets it out'
	],
	[
		'a screen that is more than open',
		'parts',
		'screen 150 % free',
		'Screen: free-area ratio 1.5 is outside the catalogue’s range.',
		'Free-area ratio 0.05 to 1, or C, such as C0.23'
	],
	[
		'a fan’s effect without its figure',
		'parts',
		'fan outlet effect',
		'“fan outlet effect”: its coefficient is missing: K of the charts, or of the maker of the fan.',
		'fan outlet effect C0.3'
	],
	['a leakage class that is none', 'leakage', 'Z', '“Z” is no leakage class.', A_CLASS],
	['a leakage class without end', 'leakage', 'CL 5000', '“CL 5000”: too leaky for a class (most CL 1000).', A_CLASS],
	[
		'a row too hot for air',
		'temperature',
		'300',
		'“300”: outside −50 to 80 °C, for which the density of air is computed.',
		'−50 to 80 °C'
	],
	['a lining in words', 'lining', 'thick', '“thick”: is not understood as a thickness.', A_LINING],
	['a lining of nothing', 'lining', '0', '“0”: a duct without a lining has a blank here.', A_LINING],
	['a lining in metres', 'lining', '25 m', '“25 m”: too thick for a lining (most 300 mm).', A_LINING],
	[
		'a lining that fills its duct',
		'lining',
		'80 metal',
		'This lining leaves no free space in the duct.',
		'less than half of the least side'
	],
	[
		'a fitting outside its table',
		'parts',
		'elbow r99',
		'Elbow: radius to centre line over diameter 99 is outside the catalogue’s range.',
		'Radius to centre line over diameter 0.5 to 10; Angle 0 to 180, or C, such as C0.23'
	],
	[
		'a fitting of another shape',
		'parts',
		'vaned elbow',
		'Vaned elbow is made for rectangular duct; this row is round.',
		'another part, or its coefficient, such as C0.23'
	],
	[
		'more equipment than a row holds',
		'parts',
		Array.from({ length: 11 }, () => '50 coil 1 Pa').join(', '),
		'There are 550 losses of equipment in one row.',
		'at most 500'
	]
];

export const BAD_SETTINGS: readonly (readonly [SettingField, string, string, string])[] = [
	[
		'temperature',
		'900',
		'Temperature of the air – “900”: outside −50 to 80 °C, for which the density of air is computed. Meanwhile the air is taken at 20 °C (68 °F).',
		'−50 to 80 °C; for other air, leave it blank and give the density'
	],
	[
		'surroundings',
		'-90',
		'Temperature around the ducts – “-90”: outside −50 to 80 °C, for which the density of air is computed. Meanwhile it is taken as inside, without thermal gravity.',
		'−50 to 80 °C'
	],
	[
		'humidity',
		'150',
		'Relative humidity – “150”: too great for a relative humidity (most 100 %). Meanwhile the air is taken at 50 %.',
		'a relative humidity, such as 50 or 50 %'
	],
	[
		'density',
		'-1',
		'Density, if given – “-1”: a density cannot be negative. Meanwhile it is computed from temperature, humidity and elevation.',
		'a density, such as 1.2 or 1.2 kg/m³'
	],
	[
		'flexFactor',
		'-3',
		'Flexible duct, times the rigid rate – “-3”: flexible duct loses 1 to 100 times what rigid duct does. Meanwhile flexible duct is taken at 4 times the rigid rate.',
		'a number from 1 to 100, such as 4'
	],
	[
		'flexCompression',
		'80 %',
		'Flexible duct, compressed by – “80 %”: too great for a compression (most 60 %). Meanwhile flexible duct is taken by its factor on the rigid rate.',
		'a compression, such as 15 or 15 %'
	],
	[
		'aspectRatio',
		'0.5',
		'Aspect ratio, at most – “0.5”: the longer side over the shorter is 1 or more. Meanwhile it is checked against 4, common practice.',
		'a number from 1 to 1000, such as 4'
	],
	[
		'mainVelocity',
		'fast',
		'Velocity in mains, at most – “fast” is not a figure. Meanwhile it is not checked.',
		'a velocity, such as 6 or 6 m/s'
	],
	[
		'damperAtOutlet',
		'perhaps',
		'A damper at every outlet – “perhaps” is neither yes nor no. Meanwhile it is not checked.',
		'yes or no'
	],
	[
		'leakage',
		'class Z',
		'Leakage class of the ductwork – “class Z” is no leakage class. Meanwhile no leakage is counted.',
		A_CLASS
	],
	[
		'standardDensity',
		'12',
		'Density of standard air – “12”: no convention of standard air has such a density. Meanwhile it is taken as 1.204 kg/m³.',
		'a density near 1.2 kg/m³, such as 1.204'
	],
	[
		'flowBasis',
		'both',
		'Flows of outlets are – “both” is none of the choices here. Meanwhile they are taken as actual flows.',
		'Actual flows, Standard flows'
	],
	[
		'method-wye',
		'gardel',
		'Method of “Wye branch” – “gardel” is the author of no method here. Meanwhile it is computed by Idelchik.',
		'Idelchik; Crane; Bassett; Idelchik, equation'
	],
	['units', 'metric', 'Units – “metric” is none of the choices here. Meanwhile the design is shown in SI.', 'SI, IP'],
	[
		'title',
		'x'.repeat(121),
		'Title on reports – This title has 121 characters. Meanwhile reports carry the tag of the system.',
		'at most 120'
	]
];
