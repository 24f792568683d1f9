import { handle } from "@/app/handle";
import { sendForReviewSchema } from "@/lib/reviews/schema";
import { sendForReview } from "@/lib/reviews/send-for-review";

export const POST = handle(sendForReviewSchema, sendForReview);
