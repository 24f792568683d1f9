import type { SignedRuns } from "@/lib/deliveries/schema-pages";
import { TextLink } from "../button/text-action";
import { Empty } from "../empty/empty";
import { AssembleForm } from "./assemble-form";

/** Choosing signed frames, their names and their formats; the size is known before anything is made. */
export function AssemblePage({ signed }: { signed: SignedRuns }) {
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pt-24 pb-72 sm:px-48">
      <p className="type-label text-soft">
        <TextLink href="/deliveries">Deliveries</TextLink>, {signed.production.name}
      </p>
      <h1 className="type-title mt-4 text-text max-sm:text-[1.875rem] max-sm:leading-38">
        Assemble a delivery.
      </h1>
      {signed.runs.length === 0 ? (
        <Empty title="No version of this production is signed off." className="mt-24">
          A delivery holds signed frames only. Versions come here once the science advisor has signed them
          off.
        </Empty>
      ) : (
        <AssembleForm signed={signed} />
      )}
    </div>
  );
}
