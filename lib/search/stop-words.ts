/**
 * Words that ask rather than name. They are left out on both sides; the judging words (bad, dangerous, ok) too, for everything
 * here is about danger, so they tell no entry from another.
 */
export const STOP_WORDS: ReadonlySet<string> = new Set(
  `a an the this that these those there here it its he him his she her they them their i im ive me my mine we our us you your
  no not is isnt are arent was wasnt were be been being am do does doesnt did dont didnt done can cant cannot could couldnt may might must
  shall should shouldnt will wont would wouldnt has have havent had having get gets getting got give gives given
  who whom whose what whats when where which why how
  of in into on onto at to from for by with as about up off out and or but nor if then than so
  any some much many very too also just really only even still ever please thanks anyone someone something anything thing things
  need needs want wants tell know think mean means say says said ask try trying use used uses using let lets
  ok okay safe safely allowed bad danger dangerous dangerously harmful worried
  cas number etc`
    .split(/\s+/)
    .filter(Boolean),
);
