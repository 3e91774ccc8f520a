/** A workshop that a member keeps. `document` is the text of its form; `version` grows at every save. */
export type MemberPlan = { id: number; name: string; document: string; version: number; updatedAt: Date };
/** The most workshops one member keeps. */
export const MAX_PLANS = 20;
