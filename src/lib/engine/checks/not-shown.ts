/** What a reviewer checks and a design document cannot show, with the reason. */
export const NOT_SHOWN: readonly { readonly what: string; readonly why: string }[] = [
	{ what: 'Every fitting on the drawing is in the calculation', why: 'the document holds no drawing to count against' },
	{
		what: 'Revision of the calculation is that of drawing and schedule; submittals agree with schedules',
		why: 'other papers are not known here'
	},
	{ what: 'Rated walls that a duct crosses, and access to their dampers', why: 'walls are not part of the document' },
	{ what: 'Balancing dampers within reach, and remote from the outlet', why: 'places are not part of the document' },
	{
		what: 'Motor margin, efficiency, specific fan power',
		why: 'motor and efficiency belong to the selection of the fan'
	},
	{
		what: 'Louvre free-area velocity against first water penetration',
		why: 'it is the maker’s figure, not the duct’s'
	},
	{ what: 'Neck velocity and noise of terminals', why: 'an outlet states its loss, not its neck' },
	{ what: 'Make-up air of a laboratory against its exhaust', why: 'a design is one air system with one fan' },
	{
		what: 'Flexible duct straight, hung without sag, through no wall, and not in place of an elbow',
		why: 'a row states its length and compression'
	},
	{ what: 'Turning vanes in elbows of other angles than 90°', why: 'the catalogue’s vaned elbows are of 90° only' },
	{
		what: 'An allowance inside a coefficient or a loss typed by hand',
		why: 'the figure does not say what it is made of'
	},
	{
		what: 'Gauge, clean-outs and access of grease ducts',
		why: 'sheet thickness and doors are not part of the document'
	},
	{ what: 'Supports and weights', why: 'they belong to the take-off' },
	{ what: 'New, existing and demolished work', why: 'rows do not tell them apart' },
	{
		what: 'One handbook’s rule for mains by flow, 0.08 to 0.6 in. w.g. in 100 ft',
		why: 'criteria of handbooks differ: the design’s own limits are tested'
	}
];
