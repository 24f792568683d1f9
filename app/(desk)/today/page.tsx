import type { Metadata } from "next";
import { load } from "@/app/load";
import { TodayPage } from "@/components/today/today-page";
import { getToday } from "@/lib/today/get-today";

export const metadata: Metadata = { title: "Today" };

export default async function Page() {
  return <TodayPage page={await load(getToday, undefined)} />;
}
