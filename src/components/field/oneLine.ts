/** Words a person typed as one line: entries hold no line breaks or control characters. */
export const oneLine = (words: string): string => words.replace(/\s+/g, ' ').trim();
