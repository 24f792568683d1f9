import { LinkButton } from "../button/link-button";
import { Threshold } from "./threshold";

/** A link that no longer opens, and what to do instead. */
export function ShutLink({ words, again }: { words: string; again?: boolean }) {
  return (
    <Threshold title="This link does not open." words={words}>
      <div className="flex flex-wrap gap-12">
        {again && (
          <LinkButton href="/reset" look="primary">
            Ask for a new link
          </LinkButton>
        )}
        <LinkButton href="/sign-in">Go to sign in</LinkButton>
      </div>
    </Threshold>
  );
}
