/** No line breaks, nothing unseen, nothing that turns the text's direction: one name cannot pass for another. */
export const ONE_LINE = /^[^\p{Cc}\u202A-\u202E\u2066-\u2069]*$/u;
export const NOT_ONE_LINE = 'Take out line breaks and characters that cannot be seen.';
