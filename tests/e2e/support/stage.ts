/** What a test file plays on: a database and a server of its own, the mail fake, and the browser. */
import { mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { chromium, type Browser, type BrowserContext, type BrowserContextOptions, type Page } from 'playwright-core';
import { afterAll, beforeAll, beforeEach } from 'vitest';
import { startMailFake } from '../../../scripts/fakes/mail.mjs';
import { freshDatabase, type TestDatabase } from '../../server/support/database';
import { signIn } from './person';
import { makeServer, type Server } from './server';

const SHOTS = '.evendraft/e2e';
const ARGUMENTS = [
	'--no-sandbox',
	'--disable-gpu',
	'--disable-quic',
	'--no-first-run',
	'--disable-background-networking',
	'--disable-component-update',
	'--disable-sync'
];

export const launch = (): Promise<Browser> =>
	chromium.launch({ executablePath: process.env.CHROMIUM || '/usr/bin/chromium', args: ARGUMENTS });

export interface Stage {
	readonly server: Server;
	readonly browser: Browser;
	readonly inboxUrl: string;
	/** A page of a browser of its own, with no cookies. Faults of its scripts are kept in `faults`. */
	readonly newPage: (options?: BrowserContextOptions) => Promise<Page>;
	/** The same of a browser in which this person is signed in; the form is filled once for each person. */
	readonly pageOf: (email: string, options?: BrowserContextOptions) => Promise<Page>;
	/** Uncaught faults of the scripts of the pages of this test. */
	readonly faults: string[];
}

/** Sets the stage for the tests of a file. Pages stay open until the next test, so that a failure can be pictured. */
export function useStage(): Stage {
	let database: TestDatabase | undefined;
	let mail: Awaited<ReturnType<typeof startMailFake>> | undefined;
	const contexts: BrowserContext[] = [];
	const faults: string[] = [];
	const signedIn = new Map<string, Awaited<ReturnType<BrowserContext['storageState']>>>();
	const stage = { faults, newPage, pageOf } as { -readonly [K in keyof Stage]: Stage[K] };

	async function newPage(options: BrowserContextOptions = {}): Promise<Page> {
		const context = await stage.browser.newContext({
			...{ baseURL: stage.server.origin, viewport: { width: 1440, height: 900 }, acceptDownloads: true },
			...options
		});
		contexts.push(context);
		context.setDefaultTimeout(15_000);
		await context.grantPermissions(['clipboard-read', 'clipboard-write'], { origin: stage.server.origin });
		const page = await context.newPage();
		page.on('pageerror', (fault) => faults.push(fault.message));
		return page;
	}

	async function pageOf(email: string, options: BrowserContextOptions = {}): Promise<Page> {
		const storageState = signedIn.get(email);
		const page = await newPage({ ...options, ...(storageState && { storageState }) });
		if (storageState) return page;
		await signIn(page, email);
		signedIn.set(email, await page.context().storageState());
		return page;
	}

	async function closeAll(): Promise<void> {
		await Promise.all(contexts.splice(0).map((context) => context.close()));
	}

	beforeAll(async () => {
		process.env.LOG_LEVEL = 'warn';
		[database, mail, stage.browser] = await Promise.all([freshDatabase(), startMailFake(), launch()]);
		const { smtpUrl, inboxUrl } = mail;
		stage.inboxUrl = inboxUrl;
		stage.server = await makeServer({ databaseUrl: process.env.DATABASE_URL ?? '', smtpUrl, inboxUrl });
		await stage.server.start();
	});

	beforeEach(async ({ task, onTestFailed }) => {
		await closeAll();
		faults.length = 0;
		onTestFailed(async () => {
			mkdirSync(SHOTS, { recursive: true });
			const name = task.name.replace(/[^\w]+/g, '-').slice(0, 80);
			const pages = contexts.flatMap((context) => context.pages());
			for (const [at, page] of pages.entries())
				await page.screenshot({ path: join(SHOTS, `${name}-${at + 1}.png`) }).catch(() => undefined);
		});
	});

	afterAll(async () => {
		await closeAll();
		await Promise.all([stage.browser?.close(), stage.server?.kill(), mail?.close()]);
		await database?.drop();
	});

	return stage;
}
