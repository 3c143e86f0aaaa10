/** The first digits of a content hash in groups of four, as the report prints them. */
export const codeOf = (sha256: string): string => sha256.slice(0, 16).replace(/(.{4})(?=.)/g, '$1 ');
