import { TextLink } from "@/components/button/text-action";
import { Empty } from "@/components/empty/empty";
import { Shell } from "./shell";

export const metadata = { title: "Not here" };

export default function NotFound() {
  return (
    <Shell native="desk">
      <div className="px-16 py-48 sm:px-48">
        <Empty level={1} title="There is no such page here, or it is not yours to see.">
          Check the address, or go <TextLink href="/">back to the start</TextLink>.
        </Empty>
      </div>
    </Shell>
  );
}
