/** Whether a text from an address can be an id: PostgreSQL fails on any other text for a uuid column. */
export const isUuid = (text: string): boolean => /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i.test(text);
