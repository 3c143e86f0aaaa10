import { expect, it } from 'vitest';
import { append, emptyDesign, firm, rowsOf, sent } from '../server/support/designs';
import { useStage } from './support/stage';

const stage = useStage();
const EMAIL = 'engineer@example.test';

/** A riser with an outlet at each piece. */
function riser(pieces: number) {
	return Array.from({ length: pieces }, (_, at): Record<string, string>[] => [
		{ tag: `R${at}`, joins: at === 0 ? '' : `R${at - 1}`, size: '900x600', length: '3' },
		{ tag: `R${at}-1`, joins: `R${at}`, serves: `Room ${at}`, flow: '40', size: 'Ø160', length: '4', outlet: '20' }
	]).flat();
}

it('the server answers others while a long report is printed', async () => {
	const ours = await firm(EMAIL);
	const designId = await emptyDesign(ours, 'long report');
	const done = await append(ours, designId, [sent(rowsOf(riser(150)).edit)]);
	expect(done.solved.problems).toEqual([]);

	const { request } = await stage.pageOf(EMAIL);
	const order: string[] = [];
	const report = request.get(`/api/v1/designs/${designId}/report.pdf`).then(async (answer) => {
		order.push('report');
		expect(answer.status()).toBe(200);
		expect((await answer.body()).subarray(0, 5).toString()).toBe('%PDF-');
	});
	// Each page waits for the one before: a server that prints on its own thread would hold up one of them to the end.
	for (let turn = 0; turn < 3; turn += 1) {
		expect((await request.get('/sign-in')).status()).toBe(200);
		order.push('page');
	}
	await report;
	expect(order).toEqual(['page', 'page', 'page', 'report']);
});
