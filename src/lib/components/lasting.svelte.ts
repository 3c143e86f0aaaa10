/**
 * Whether something has been so for a while: a sign of it then shows no flicker where it ends at once. Call it while a
 * component is set up.
 *
 * @param wait How long it must have been so [ms].
 */
export function lasting(test: () => boolean, wait: number): { readonly current: boolean } {
	let current = $state(false);
	$effect(() => {
		if (!test()) {
			current = false;
			return;
		}
		const timer = setTimeout(() => (current = true), wait);
		return () => clearTimeout(timer);
	});
	return {
		get current() {
			return current;
		}
	};
}
