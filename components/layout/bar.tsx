import Link from 'next/link';
import { Mark } from './mark';
import { SearchField } from './search-field';
import { ThemeSwitch } from './theme-switch';
import { UnitsSwitch } from './units-switch';

const PLACES = [
  { href: '/library', name: 'Library' },
  { href: '/check', name: 'Check' },
  { href: '/worksheets', name: 'Worksheets' },
];

function Places() {
  return (
    <nav aria-label="Main">
      <ul className="flex gap-x-5">
        {PLACES.map(({ href, name }) => (
          <li key={href}>
            <Link href={href} prefetch={false} className="inline-block py-1.5 font-semibold hover:underline">
              {name}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

/** The bar on top of every page. */
export function Bar() {
  return (
    <header className="bar border-b-2 border-ink bg-surface">
      <div className="bar-grid mx-auto max-w-page px-4 py-2 sm:px-6">
        <Link href="/" prefetch={false} className="bar-name flex items-center gap-2 py-1 text-lg font-bold sm:text-xl">
          <Mark /> Fumelore
        </Link>
        <div className="bar-search">
          <SearchField />
        </div>
        <Places />
        <div className="bar-switches flex items-center gap-1.5">
          <UnitsSwitch />
          <ThemeSwitch />
        </div>
      </div>
    </header>
  );
}
