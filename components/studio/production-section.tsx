import { Cell, HeadCell, Row, Table } from "../table/table";
import { ConfirmDelete } from "./confirm-delete";
import { dayOf } from "./moments";
import type { Member, PendingInvitation, ProductionPeople } from "./people-schema";
import { roleWords } from "./words";

const kindWords: Record<string, string> = { film: "film", dome: "full dome" };

export interface ProductionSectionProps {
  production: ProductionPeople;
  timeZone: string;
}

/** A production's people, and below them those who are invited. */
export function ProductionSection({ production, timeZone }: ProductionSectionProps) {
  const { id, code, name, kind, members, invitations } = production;
  return (
    <section aria-labelledby={`production-${id}`}>
      <h2 id={`production-${id}`} className="type-heading flex flex-wrap items-baseline gap-x-12 text-text">
        {name}
        <span className="type-label text-soft">
          <span className="type-figure">{code}</span>, {kindWords[kind] ?? kind}
        </span>
      </h2>
      {members.length + invitations.length === 0 ? (
        <p className="type-body mt-12 text-soft">Nobody is in it yet. Invite its producer first.</p>
      ) : (
        <Table className="mt-12 table-fixed" aria-labelledby={`production-${id}`}>
          <thead>
            <tr>
              <HeadCell className="w-2/5">name</HeadCell>
              <HeadCell>role</HeadCell>
              <HeadCell className="w-162 max-sm:hidden">since</HeadCell>
              <HeadCell className="w-124">
                <span className="sr-only">what can be done</span>
              </HeadCell>
            </tr>
          </thead>
          <tbody>
            {members.map((member) => (
              <MemberRow key={member.personId} production={production} member={member} timeZone={timeZone} />
            ))}
            {invitations.map((invitation) => (
              <InvitationRow key={invitation.id} invitation={invitation} timeZone={timeZone} />
            ))}
          </tbody>
        </Table>
      )}
    </section>
  );
}

function MemberRow({ production, member, timeZone }: ProductionSectionProps & { member: Member }) {
  const { personId, name, email, role, since } = member;
  return (
    <Row>
      <Named name={name} email={email} />
      <Cell>{roleWords[role] ?? role}</Cell>
      <Cell className="type-figure whitespace-nowrap max-sm:hidden">{dayOf(since, timeZone)}</Cell>
      <Cell className="text-right">
        <ConfirmDelete
          path={`/api/productions/${production.id}/people/${personId}`}
          word="End membership"
          about={name}
          title={`End ${name}’s membership of ${production.name}?`}
          description="They are out with their next click. What they made and said stays, and they can be invited again."
        />
      </Cell>
    </Row>
  );
}

function InvitationRow({ invitation, timeZone }: { invitation: PendingInvitation; timeZone: string }) {
  const { id, name, email, role, by, expiresAt } = invitation;
  return (
    <Row faint>
      <Named name={name} email={email} />
      <Cell>
        {role && (roleWords[role] ?? role)}, invited by {by}
      </Cell>
      <Cell className="max-sm:hidden">
        open until <span className="type-figure whitespace-nowrap">{dayOf(expiresAt, timeZone)}</span>
      </Cell>
      <Cell className="text-right">
        <ConfirmDelete
          path={`/api/invitations/${id}`}
          word="Take back"
          about={`the invitation to ${name}`}
          title={`Take back the invitation to ${name}?`}
          description={`The link sent to ${email} stops working. You can invite them again.`}
        />
      </Cell>
    </Row>
  );
}

function Named({ name, email }: { name: string; email: string }) {
  return (
    <Cell className="py-8">
      {name}
      <span className="type-small block text-soft wrap-anywhere">
        {email.split("@")[0]}
        <wbr />@{email.split("@")[1]}
      </span>
    </Cell>
  );
}
