/** A name as a spreadsheet may safely open it: one that begins with = + - @ (or a tab or return) gets a leading apostrophe. Numbers are not names. */
export const guarded = (text: string): string => (/^[=+\-@\t\r]/.test(text) ? `'${text}` : text);
