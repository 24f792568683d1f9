"use client";

import { useEffect, useRef } from "react";
import { LinkButton } from "../button/link-button";
import { TextLink } from "../button/text-action";
import { Message } from "../message/message";
import { listNames } from "../words/number-words";

export interface GivenProps {
  statement: string;
  told: readonly string[];
  version: string;
}

/** The declaration as it was kept, once it is given. */
export function Given({ statement, told, version }: GivenProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <section className="mt-24 max-w-720">
      <Message kind="settled">
        <h2 ref={heading} tabIndex={-1} className="font-medium outline-none">
          Your declaration is given, and stands in the log.
        </h2>
        {told.length > 0 && (
          <p>
            {listNames(told)} {told.length === 1 ? "is" : "are"} told by letter.
          </p>
        )}
      </Message>
      <div className="type-prose mt-24 grid gap-16 border-l border-edge pl-16 break-words text-text">
        {statement.split("\n\n").map((paragraph) => (
          <p key={paragraph}>{paragraph}</p>
        ))}
      </div>
      <div className="mt-24 flex flex-wrap items-center gap-16">
        <LinkButton href="/review" look="primary">
          What else waits
        </LinkButton>
        <TextLink href={`/versions/${version}`}>Back to the version</TextLink>
      </div>
    </section>
  );
}
