declare global {
	namespace App {
		interface Error {
			message: string;
			/** Under which the server's log has the cause. */
			id?: string;
		}
	}
}

export {};
