/** A room of a workshop; `volume` in m3. */
export type Room = { name: string; usedFor: string; volume: number };
export type Workshop = { name: string; about: string; rooms: Room[] };
