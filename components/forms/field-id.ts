/** The id of the field for a name or a fault's dotted path. */
export const fieldId = (path: string) => `field-${path.replace(/[^A-Za-z0-9]+/g, '-')}`;
