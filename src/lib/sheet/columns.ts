/** The columns of the run sheet, from left to right. */
import type { QuantityName } from '$lib/engine';
import type { RowField } from './sheet';

export type ComputedKey = 'velocity' | 'rate' | 'duct' | 'fittings' | 'equipment' | 'total' | 'spare' | 'marks';

export interface Column {
	readonly key: RowField | ComputedKey;
	readonly group: 'entered' | 'computed';
	readonly head: string;
	/** Names the unit in the head. */
	readonly quantity?: QuantityName;
	/** [px] */
	readonly width: number;
	readonly align: 'left' | 'right';
	/** Left out until a person asks for it. */
	readonly optional?: boolean;
	/** Takes what is left of the width. */
	readonly grows?: boolean;
	/** Read out and shown as a hint. */
	readonly about: string;
}

const entered = (key: RowField, head: string, width: number, about: string, more: Partial<Column> = {}): Column => ({
	...{ key, group: 'entered', head, width, about, align: 'right' },
	...more
});
const computed = (
	key: ComputedKey,
	head: string,
	width: number,
	about: string,
	more: Partial<Column> = {}
): Column => ({
	...{ key, group: 'computed', head, width, about, align: 'right' },
	...more
});

export const COLUMNS: readonly Column[] = [
	entered('tag', 'Section', 116, 'Tag of the duct section', { align: 'left' }),
	entered('joins', 'Joins', 44, 'Tag of the row on the fan’s side; blank where it meets the fan', { align: 'left' }),
	entered('side', 'Side', 50, 'Supply, return, exhaust or outdoor; blank as the row it joins', { align: 'left' }),
	entered('serves', 'Serves', 80, 'Room served, or from where to where', { align: 'left', grows: true }),
	entered('flow', 'Flow', 54, 'Design flow of the outlet; sums elsewhere', { quantity: 'flow' }),
	entered('size', 'Size', 84, 'Inside size', { quantity: 'size', align: 'left' }),
	entered('length', 'Length', 48, 'On the centre line, rigid duct', { quantity: 'length' }),
	entered('rise', 'Rise', 42, 'Far end over the fan end', { quantity: 'length', optional: true }),
	entered('flex', 'Flex.', 42, 'Length of flexible duct', { quantity: 'length' }),
	entered('material', 'Material', 96, 'Blank as in the basis of design', { align: 'left', optional: true }),
	entered('lining', 'Lining', 62, 'Thickness of the liner; the size is the free one unless metal stands behind it', {
		quantity: 'size',
		optional: true
	}),
	entered('leakage', 'Leakage', 60, 'Leakage class; blank as in the basis of design', {
		align: 'left',
		optional: true
	}),
	entered('temperature', 'Temp.', 48, 'Of the air in the row and those beyond it; blank as the row it joins', {
		quantity: 'temperature',
		optional: true
	}),
	entered('parts', 'Parts', 104, 'Junction at the fan end, fittings and equipment', { align: 'left' }),
	entered('outlet', 'Outlet', 52, 'Total-pressure loss of the outlet at its flow; blank is an open end', {
		quantity: 'pressure'
	}),
	entered('pressure', 'Room', 46, 'Gauge pressure of the room', { quantity: 'pressure', optional: true }),
	computed('velocity', 'Vel.', 46, 'Mean velocity', { quantity: 'velocity' }),
	computed('rate', 'Rate', 48, 'Friction rate of the rigid duct', { quantity: 'rate' }),
	computed('duct', 'Duct', 48, 'Friction loss of rigid and flexible duct', { quantity: 'pressure' }),
	computed('fittings', 'Fittings', 52, 'Loss of the junction and the fittings', { quantity: 'pressure' }),
	computed('equipment', 'Equip.', 48, 'Loss of equipment and outlet', { quantity: 'pressure' }),
	computed('total', 'Total', 52, 'Loss of total pressure in the section', { quantity: 'pressure' }),
	computed('spare', 'Spare', 74, 'Spare pressure of the best path through the section', {
		quantity: 'pressure',
		align: 'left'
	}),
	computed('marks', '', 28, 'Problems and checks of the row')
];
