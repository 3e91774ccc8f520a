import { Notice } from '@/components/ui/notice';
import { Quantity } from '@/components/ui/quantity';
import type { Workshop } from '@/lib/workshops/workshop';

/** The invented workshops of the demo, marked as such. */
export function DemoWorkshops({ workshops }: { workshops: Workshop[] }) {
  return workshops.map(({ name, about, rooms }) => (
    <section key={name} aria-label={name} className="space-y-2">
      <h2>{name}</h2>
      <Notice kind="demo" />
      <p>{about} The starter library’s editor and reviewer are demo roles too: no person stands behind them.</p>
      <ul className="list-disc pl-6">
        {rooms.map((room) => (
          <li key={room.name}>
            {room.name}: {room.usedFor}; <Quantity kind="volume" value={room.volume} />
          </li>
        ))}
      </ul>
    </section>
  ));
}
