import { NotHere } from "@/components/empty/not-here";
import { Shell } from "./shell";

export const metadata = { title: "Not here" };

export default function NotFound() {
  return (
    <Shell native="desk">
      <NotHere />
    </Shell>
  );
}
