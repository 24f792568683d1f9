import { NotHere } from "@/components/empty/not-here";

export default function NotFound() {
  return <NotHere />;
}
