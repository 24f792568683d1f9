import type { DoorPage } from "@/lib/deliveries/schema-pages";
import { LinkButton } from "../button/link-button";
import { ReceiptForm } from "./receipt-form";

/** A door that is not open: why, and what can be done. Nothing of what lies behind it is shown. */
export function ShutDoor({ door }: { door: DoorPage }) {
  const { state, receipt } = door;
  if (state.kind === "open") return null;
  return (
    <div className="max-w-720">
      <h1 className="type-title mt-16 text-text max-sm:text-[1.75rem] max-sm:leading-33">
        {state.kind === "stopped" ? "Downloads of this delivery are stopped." : "This delivery is closed."}
      </h1>
      <p className="type-prose mt-4 text-soft">{door.title}.</p>
      <div className="mt-24 grid gap-12 border-l-3 border-ember pl-16">
        {state.why.map((reason) => (
          <p key={reason} className="type-prose text-text">
            {reason}
          </p>
        ))}
      </div>
      <p className="type-body mt-24 text-soft">
        {state.kind === "stopped"
          ? "If you have the files already, please do not use these frames. The studio will tell you what follows."
          : "If you need the files, ask the person at the studio who sent them."}
      </p>
      {receipt ? (
        <p className="type-note mt-24 break-words whitespace-pre-line text-text">“{receipt.statement}”</p>
      ) : (
        state.kind === "stopped" && (
          <div className="mt-36 border-t border-text pt-16">
            <ReceiptForm door={door} files={0} isTaken onlyRefuse />
          </div>
        )
      )}
      <LinkButton href="/deliveries" className="mt-36">
        Your deliveries
      </LinkButton>
    </div>
  );
}
