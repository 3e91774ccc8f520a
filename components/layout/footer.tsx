import Link from 'next/link';
import { CautionLine } from '@/components/ui/caution';

const LEFT_OUT =
  'What is written here leaves out the room, the machine and the duct it was not told of, and what nobody has measured.';

export function Footer() {
  return (
    <footer className="mt-16 border-t border-rule">
      <div className="mx-auto max-w-page space-y-3 px-4 py-6 text-base text-quiet sm:px-6">
        <div className="max-w-measure">
          <CautionLine leavesOut={LEFT_OUT} />
        </div>
        <nav aria-label="About">
          <ul className="flex flex-wrap items-baseline gap-x-5 gap-y-1">
            <li className="font-semibold text-ink">Fumelore</li>
            <li>
              <Link href="/library/sources" prefetch={false}>
                Sources
              </Link>
            </li>
            <li>
              <Link href="/about" prefetch={false}>
                About
              </Link>
            </li>
          </ul>
        </nav>
      </div>
    </footer>
  );
}
