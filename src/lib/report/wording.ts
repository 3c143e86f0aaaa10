import type { FlagRule, Item, Service, Side } from '$lib/engine';
import type { ReportStatus } from './model';

/** En rule: nothing there. Never 0 for nothing. */
export const NOTHING = '–';

export const STATUS: Readonly<Record<ReportStatus, string>> = {
	'work-in-progress': 'Work in progress',
	'issued-for-review': 'Issued for review'
};

/** Any status of a version, also one of another time, in plain words. */
export function statusInWords(status: string): string {
	if (status in STATUS) return STATUS[status as ReportStatus];
	const words = status.replaceAll('-', ' ').trim();
	return words === '' ? NOTHING : words.charAt(0).toUpperCase() + words.slice(1);
}

export const SIDE: Readonly<Record<Side, string>> = {
	supply: 'Supply',
	return: 'Return',
	exhaust: 'Exhaust',
	outdoor: 'Outdoor air'
};

export const PART: Readonly<Record<Item['part'], string>> = {
	duct: 'Duct',
	flexible: 'Flexible duct',
	junction: 'Junction',
	fitting: 'Fitting',
	equipment: 'Equipment',
	outlet: 'Outlet',
	gravity: 'Thermal gravity'
};

export const SERVICE: Readonly<Record<Service, string>> = {
	general: 'General ventilation',
	'kitchen-grease': 'Kitchen grease exhaust',
	laboratory: 'Laboratory exhaust',
	hazardous: 'Hazardous exhaust',
	'smoke-control': 'Smoke control'
};

export const RULE: Readonly<Record<FlagRule, string>> = {
	'reynolds-transition': 'Flow between laminar and turbulent',
	'no-junction-loss': 'Junction without a loss',
	'junction-at-fan': 'Junction at the fan',
	'velocity-main': 'Velocity in mains',
	'velocity-run-out': 'Velocity in run-outs',
	'friction-rate': 'Friction rate',
	'velocity-plausible': 'Velocity hardly found in a duct',
	'friction-rate-plausible': 'Friction rate hardly found in a duct',
	'flexible-length': 'Length of flexible duct',
	'aspect-ratio': 'Aspect ratio',
	'damper-missing': 'Damper at the outlet',
	'coefficient-range': 'Coefficient outside the range of its source',
	'to-be-confirmed': 'To be confirmed',
	'fan-flows-differ': 'Flows of the two sides of the fan',
	'temperature-mix': 'Temperature of united streams',
	'leakage-not-settled': 'Leakage that does not settle',
	'leakage-reversed': 'Leakage against its side',
	condensation: 'Air below its dew point',
	'service-caution': 'Special service',
	'fire-damper-caution': 'Fire or smoke damper',
	'negative-loss': 'Section with a gain of pressure',
	'rise-exceeds-length': 'Rise greater than length',
	'static-loss-at-inlet': 'Loss given as static at an inlet',
	'end-counted-twice': 'End of a run counted twice',
	'flexible-default': 'Flexible duct at the default factor',
	'negative-duty': 'Fan duty below nothing',
	'losses-as-entered': 'Losses entered for other air',
	'damper-open-assumed': 'Damper taken as open',
	'key-not-read': 'Entry that was not read'
};

const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'];
const ISO = /^(\d{4})-(\d{2})-(\d{2})(?:T(\d{2}:\d{2}))?/;

/** 23 Nov 2026, in UTC as stored, whatever the machine's time zone; the en rule for nothing. */
export function dateOf(iso: string | null): string {
	const found = iso === null ? null : ISO.exec(iso);
	if (!found) return NOTHING;
	return `${Number(found[3])} ${MONTHS[Number(found[2]) - 1] ?? '?'} ${found[1]}`;
}

/** 23 Nov 2026, 14:32 UTC. */
export function momentOf(iso: string | null): string {
	const found = iso === null ? null : ISO.exec(iso);
	if (!found) return NOTHING;
	return found[4] === undefined ? dateOf(iso) : `${dateOf(iso)}, ${found[4]} UTC`;
}

export function orNothing(text: string | null | undefined): string {
	const trimmed = (text ?? '').trim();
	return trimmed === '' ? NOTHING : trimmed;
}

/** 1 section, 20 sections. */
export function counted(count: number, one: string, many = `${one}s`): string {
	return `${count} ${count === 1 ? one : many}`;
}
