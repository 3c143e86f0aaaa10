import type { Role } from '../db/tables/firms';

declare const proved: unique symbol;

/** Proof that a person belongs to a firm, and as what. Only the membership check makes one. */
export interface FirmScope {
	readonly firmId: string;
	readonly userId: string;
	readonly role: Role;
	readonly [proved]: true;
}

/** The one place where a scope is made; called by the membership check, and where a firm is founded. */
export function provenScope(firmId: string, userId: string, role: Role): FirmScope {
	return { firmId, userId, role } as FirmScope;
}

const MAY_EDIT: readonly Role[] = ['owner', 'administrator', 'engineer', 'checker'];

/** Whether the role may create and edit projects and designs. */
export const mayEdit = (scope: FirmScope): boolean => MAY_EDIT.includes(scope.role);
