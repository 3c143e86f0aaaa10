/** Characters of one cell, at most. */
export const MOST_TYPED = 2_000;

/** PostgreSQL's JSON takes neither NUL nor half of a surrogate pair; nobody types them on purpose. */
export const storableText = (text: string) => text.replaceAll('\0', '').replace(/\p{Surrogate}/gu, '\ufffd');
