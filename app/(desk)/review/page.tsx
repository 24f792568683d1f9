import type { Metadata } from "next";
import { load } from "@/app/load";
import { ReviewPage } from "@/components/review/review-page";
import { listQueue } from "@/lib/reviews/list-queue";

export const metadata: Metadata = { title: "Review" };

export default async function Page() {
  return <ReviewPage queue={await load(listQueue, undefined)} />;
}
