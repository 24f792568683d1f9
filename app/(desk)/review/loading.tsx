import { Loading } from "@/components/empty/loading";

export default function Load() {
  return <Loading what="the versions in review" />;
}
