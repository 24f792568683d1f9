import type { ReactNode } from "react";
import { TextLink } from "../button/text-action";

export interface StudioPlace {
  href: string;
  label: string;
  current?: boolean;
}

export interface StudioPageProps {
  title: ReactNode;
  /** The parts of the studio this reader may see. */
  places: StudioPlace[];
  children: ReactNode;
}

/** The frame of every studio page: its parts as words, then one title. */
export function StudioPage({ title, places, children }: StudioPageProps) {
  return (
    <div className="mx-auto w-full max-w-1440 px-16 pt-24 pb-72 sm:px-48">
      {places.length > 1 && (
        <nav aria-label="Parts of the studio">
          <ul className="type-label flex flex-wrap gap-x-16 gap-y-8">
            {places.map(({ href, label, current }) => (
              <li key={href}>{current ? <Here>{label}</Here> : <TextLink href={href}>{label}</TextLink>}</li>
            ))}
          </ul>
        </nav>
      )}
      <h1 className="type-title mt-8 text-text">{title}</h1>
      {children}
    </div>
  );
}

function Here({ children }: { children: ReactNode }) {
  return (
    <span aria-current="page" className="text-soft">
      {children}
    </span>
  );
}
