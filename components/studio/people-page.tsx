import { Accounts } from "./accounts";
import { InviteForm } from "./invite-form";
import { NewProductionForm } from "./new-production-form";
import type { Account, ProductionPeople } from "./people-schema";
import { ProductionSection } from "./production-section";
import { StudioPage, type StudioPlace } from "./studio-page";
import { capitalised, countOf } from "../words/number-words";
import { Empty } from "../empty/empty";

export interface PeoplePageProps {
  productions: ProductionPeople[];
  accounts: Account[];
  mayCreate: boolean;
  mayClose: boolean;
  readerId: string;
  timeZone: string;
  places: StudioPlace[];
}

/** Who is in which production, who is asked to be, and the acts that change either. */
export function PeoplePage(props: PeoplePageProps) {
  const { productions, accounts, mayCreate, mayClose, readerId, timeZone, places } = props;
  return (
    <StudioPage title={titleOf(productions)} places={places}>
      <div className="mt-24 grid gap-48 lg:grid-cols-[minmax(0,1fr)_360px] lg:gap-72">
        <div className="grid min-w-0 content-start gap-48">
          {productions.map((production) => (
            <ProductionSection key={production.id} production={production} timeZone={timeZone} />
          ))}
          {productions.length === 0 && (
            <Empty title="There is no production yet.">
              Begin one, then invite its producer, artists and science advisor.
            </Empty>
          )}
          {mayClose && <Accounts accounts={accounts} readerId={readerId} />}
        </div>
        <aside className="grid content-start gap-48">
          {productions.length > 0 && (
            <InviteForm productions={productions.map(({ id, name }) => ({ id, name }))} />
          )}
          {mayCreate && <NewProductionForm />}
        </aside>
      </div>
    </StudioPage>
  );
}

function titleOf(productions: ProductionPeople[]): string {
  const people = new Set(productions.flatMap(({ members }) => members.map(({ personId }) => personId))).size;
  const invitations = productions.reduce((sum, { invitations }) => sum + invitations.length, 0);
  const who = countOf(people, "person", "people");
  const where = countOf(productions.length, "production", "productions");
  const wait = invitations === 0 ? "" : `, ${countOf(invitations, "invitation", "invitations")} out`;
  return capitalised(`${who} in ${where}${wait}.`);
}
