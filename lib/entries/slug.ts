/** True for what an address may hold as the name of an entry; anything else is not looked up. */
export const isSlug = (text: string) => text.length <= 60 && /^[a-z0-9]+(-[a-z0-9]+)*$/.test(text);
