const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;

/** Whether a text of an address or a form can be an id at all; the database refuses to look for another. */
export const isId = (text: string): boolean => UUID.test(text);
