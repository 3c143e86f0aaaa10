import type { Size } from '../shape';
import type { Note } from './definition';
import { choiceParameter } from './parameters';

export const plane = choiceParameter('plane', 'Side in the plane of the bend', 'width', ['width', 'height']);

/** H/W: the side parallel to the axis of the bend over the side in its plane. */
export const aspectInPlane = (size: Size, inPlane: string, note: Note): number => {
	if (size.shape === 'round') return 1;
	if (size.shape === 'oval') note('the method for rectangles stands in for a flat oval');
	return inPlane === 'width' ? size.height / size.width : size.width / size.height;
};
