/** The names that a title block shows. */
export interface Heading {
	readonly designId: string;
	readonly projectId: string;
	readonly firm: string;
	readonly projectNumber: string;
	readonly projectName: string;
	readonly name: string;
	readonly service: string;
}
