"use client";

import { TextAction, TextLink } from "@/components/button/text-action";
import { Empty } from "@/components/empty/empty";
import { Figure } from "@/components/figure/figure";

export interface FaultProps {
  error: Error & { digest?: string };
  reset: () => void;
}

/** What a page says when something failed that no rule foresaw. */
export function Fault({ error, reset }: FaultProps) {
  return (
    <div className="px-16 py-48 sm:px-48">
      <Empty failed level={1} title="This page could not be made.">
        <p>
          Something failed on our side; nothing you had saved is lost.{" "}
          <TextAction onClick={reset}>Try again</TextAction>, or go{" "}
          <TextLink href="/">back to the start</TextLink>.
        </p>
        {error.digest && (
          <p className="mt-8 text-soft">
            If it stays so, tell the studio’s owner this fault’s number: <Figure>{error.digest}</Figure>.
          </p>
        )}
      </Empty>
    </div>
  );
}
