/** A file to keep, named after what it is; never cached by anybody between. */
export function download(body: BodyInit, type: string, name: string): Response {
	const plain = name.replace(/[^\w. -]+/g, '-');
	return new Response(body, {
		headers: {
			'content-type': type,
			'content-disposition': `attachment; filename="${plain}"; filename*=UTF-8''${encodeURIComponent(name)}`,
			'cache-control': 'private, no-store'
		}
	});
}
