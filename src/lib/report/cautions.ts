import { isExhaustOnly } from './discharge';
import type { ReportInput } from './input';
import type { Caution } from './model';
import { SERVICE } from './wording';

export const CALCULATION_AID = 'Calculation aid. Results need review by a licensed professional; local codes govern.';

/** What the report is not, and the cautions of the matters that it touches. Each is said once. */
export function cautionsOf({ document, solution }: ReportInput): Caution[] {
	const cautions: Caution[] = [
		{ title: 'Calculation aid', text: 'Results need review by a licensed professional; local codes govern.' },
		{
			title: 'Status',
			text: 'The stamp is a software record of status only. It is not a professional seal, and the box for one is left empty by the program.'
		},
		{
			title: 'Known how well',
			text: 'Coefficients and roughness come from published data, from makers or from a person, as the list of sources says. Each is known within a band; losses as built differ.'
		}
	];
	const service = document.service ?? 'general';
	const seen = new Set<string>();
	for (const { rule, message } of solution.flags) {
		if (rule !== 'service-caution' && rule !== 'fire-damper-caution') continue;
		if (seen.has(message)) continue;
		seen.add(message);
		const title = rule === 'fire-damper-caution' ? 'Fire and smoke dampers' : specialTitle(service);
		cautions.push({ title, text: message });
	}
	if (isExhaustOnly(document))
		cautions.push({
			title: 'Combustion air',
			text: 'Exhaust without make-up air can draw flue gas into the building. Check fuel-burning appliances and make-up air.'
		});
	cautions.push({
		title: 'On site',
		text: 'Balancing and survey mean work at height and near moving parts; entry into large ducts, plenums and units may need a permit.'
	});
	return cautions;
}

function specialTitle(service: keyof typeof SERVICE): string {
	return service === 'general' ? 'Special service' : SERVICE[service];
}
