import Link from "next/link";
import type { ReactNode } from "react";

export interface TopbarItem {
  href: string;
  label: string;
  current: boolean;
}

export interface TopbarProps {
  items: TopbarItem[];
  production?: string | undefined;
  person?: string | undefined;
  role?: string | undefined;
  /** The reader's own matters, at the right end: which room to read in, the way out. */
  children?: ReactNode;
}

/** The bar every page of the studio begins with. Beside 1280 px the screens' names stand in its middle; on a phone, in a second line. */
export function Topbar({ items, production, person, role, children }: TopbarProps) {
  return (
    <header className="type-label border-b border-hair px-16 text-soft sm:px-24">
      <div className="grid grid-cols-[auto_1fr] items-center gap-x-24 md:grid-cols-[auto_auto_1fr] xl:grid-cols-[1fr_auto_1fr]">
        <Link
          href="/"
          className="type-note flex h-39 items-center pb-2 justify-self-start text-text hover:text-bright"
        >
          Ringwright
        </Link>
        {items.length > 0 && (
          <nav aria-label="Screens" className="order-last col-span-full md:order-none md:col-span-1">
            <ul className="flex flex-wrap justify-between gap-x-16 xl:gap-x-28 md:justify-start">
              {items.map((item) => (
                <NavItem key={item.href} {...item} />
              ))}
            </ul>
          </nav>
        )}
        <div className="flex min-h-39 flex-wrap items-center justify-end gap-x-16 justify-self-end xl:col-start-3">
          {person && (
            <span className="hidden text-right sm:inline">
              {production && <>{production}&ensp;·&ensp;</>}
              {person}
              {role && `, ${role}`}
            </span>
          )}
          {children}
        </div>
      </div>
    </header>
  );
}

function NavItem({ href, label, current }: TopbarItem) {
  return (
    <li>
      <Link
        href={href}
        aria-current={current ? "page" : undefined}
        className={`relative flex h-39 items-center hover:text-bright ${current ? "text-bright" : ""}`}
      >
        {label}
        {current && (
          <span
            aria-hidden="true"
            className="absolute inset-x-0 -bottom-1 h-7 border border-t-0 border-bright"
          />
        )}
      </Link>
    </li>
  );
}
