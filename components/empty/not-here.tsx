import { TextLink } from "../button/text-action";
import { Empty } from "./empty";

/** What stands in place of a page that does not exist, or that the reader may not know of: the same words for both. */
export function NotHere() {
  return (
    <div className="px-16 py-48 sm:px-48">
      <Empty level={1} title="There is no such page here, or it is not yours to see.">
        Check the address, or go <TextLink href="/">back to the start</TextLink>.
      </Empty>
    </div>
  );
}
