import { sayBytes } from "@/lib/deliveries/schema-bytes";
import type { DeliveryPage as Facts } from "@/lib/deliveries/schema-pages";
import { frameWords } from "@/lib/reviews/schema-declaration";
import { TextLink } from "../button/text-action";
import { Digest } from "../figure/digest";
import { Figure } from "../figure/figure";
import { LivePage } from "../live/live-page";
import { Message } from "../message/message";
import { Standing } from "../standing/standing";
import { dayOf } from "../studio/moments";
import { ContentsTable } from "./contents-table";
import { PublishForm } from "./publish-form";
import { RecipientTable } from "./recipient-table";
import { WithdrawDelivery } from "./withdraw-delivery";

/** The studio's page of a delivery: what is in it, whom it went to, what they took and signed. */
export function DeliveryPage({ delivery }: { delivery: Facts }) {
  const { reader, stops, withdrawnAt, publishedAt, manifestDigest, recipients } = delivery;
  const isOpen = withdrawnAt === null;
  return (
    <div className="mx-auto w-full max-w-1920 px-16 pt-24 pb-72 sm:px-48">
      <LivePage about={{ deliveryId: delivery.id }} />
      <p className="type-label text-soft">
        <TextLink href="/deliveries">Deliveries</TextLink>, {delivery.production}, delivery {delivery.number}
      </p>
      <div className="mt-4 flex flex-wrap items-baseline justify-between gap-x-24 gap-y-8">
        <h1 className="type-title text-text max-sm:text-[1.875rem] max-sm:leading-38">{delivery.title}</h1>
        {delivery.standing ? (
          <Standing standing={delivery.standing} />
        ) : (
          <span className="text-soft">withdrawn</span>
        )}
      </div>
      <p className="type-label mt-8 max-w-720 text-soft">
        <Figure>{delivery.files}</Figure> files, <Figure>{sayBytes(delivery.bytes)}</Figure>. {delivery.maker}{" "}
        made it on {dayOf(delivery.madeAt, reader.timeZone)}
        {publishedAt
          ? `; published on ${dayOf(publishedAt, reader.timeZone)}.`
          : "; nobody outside the studio sees it yet."}
      </p>
      {delivery.words && <p className="type-note mt-12 max-w-720 text-text">“{delivery.words}”</p>}
      <Troubles delivery={delivery} stops={stops} />
      <div className="mt-36 grid gap-x-72 gap-y-48 lg:grid-cols-[minmax(0,1fr)_minmax(320px,440px)]">
        <div className="min-w-0">
          <ContentsTable sets={delivery.sets} texts={delivery.texts} />
          {recipients.length > 0 && (
            <RecipientTable
              recipients={recipients}
              downloads={delivery.downloads}
              timeZone={reader.timeZone}
            />
          )}
        </div>
        <div className="grid min-w-0 content-start gap-36">
          {isOpen && publishedAt === null && delivery.mayPublish && (
            <PublishForm delivery={delivery.id} clients={delivery.clients} isStopped={stops.length > 0} />
          )}
          {manifestDigest && (
            <section>
              <h2 className="type-label border-b border-text pb-8 font-medium text-text">
                The manifest’s digest
              </h2>
              <Digest digest={manifestDigest} className="mt-12" />
              <p className="type-label mt-8 text-soft">A receipt is signed under it.</p>
            </section>
          )}
          <details>
            <summary className="type-label cursor-pointer border-b border-text pb-8 font-medium text-text">
              The science note that goes along
            </summary>
            <pre className="type-figure-small mt-12 whitespace-pre-wrap text-text">{delivery.note}</pre>
          </details>
          {isOpen && delivery.mayWithdraw && (
            <WithdrawDelivery id={delivery.id} number={delivery.number} isPublished={publishedAt !== null} />
          )}
        </div>
      </div>
    </div>
  );
}

function Troubles({ delivery, stops }: { delivery: Facts; stops: Facts["stops"] }) {
  if (delivery.withdrawnAt)
    return (
      <Message announce={false} className="mt-16 max-w-720">
        It was withdrawn on {dayOf(delivery.withdrawnAt, delivery.reader.timeZone)}: “
        {delivery.withdrawnWords}”
      </Message>
    );
  return stops.map((stop) => (
    <Message key={`${stop.versionId} ${stop.at}`} kind="work" announce={false} className="mt-16 max-w-720">
      {stop.shotCode}, version {stop.number}, {frameWords(stop.first, stop.last)}:{" "}
      {stop.kind === "withdrawn" ? "the sign-off was withdrawn" : "the frames were returned"}: “{stop.words}”{" "}
      {delivery.publishedAt
        ? "Downloads are stopped, and the recipients were told."
        : "It cannot be published."}{" "}
      Withdraw it, and assemble another from frames that are signed.
    </Message>
  ));
}
