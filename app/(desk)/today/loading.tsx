import { Loading } from "@/components/empty/loading";

export default function Load() {
  return <Loading what="what waits for you" />;
}
