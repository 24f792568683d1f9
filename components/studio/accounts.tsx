import { Cell, HeadCell, Row, Table } from "../table/table";
import { ConfirmDelete } from "./confirm-delete";
import type { Account } from "./people-schema";

/** Everyone who can sign in, for the studio's owner. */
export function Accounts({ accounts, readerId }: { accounts: Account[]; readerId: string }) {
  return (
    <section aria-labelledby="accounts">
      <h2 id="accounts" className="type-heading text-text">
        Everyone with an account
      </h2>
      <Table className="mt-12 table-fixed" aria-labelledby="accounts">
        <thead>
          <tr>
            <HeadCell className="sm:w-2/5">name</HeadCell>
            <HeadCell className="max-sm:hidden">e-mail</HeadCell>
            <HeadCell className="w-124">
              <span className="sr-only">what can be done</span>
            </HeadCell>
          </tr>
        </thead>
        <tbody>
          {accounts.map(({ id, name, email, isOwner }) => (
            <Row key={id}>
              <Cell>
                {name}
                {isOwner && <span className="text-soft">, the studio&rsquo;s owner</span>}
              </Cell>
              <Cell className="max-sm:hidden">{email}</Cell>
              <Cell className="text-right">
                {id !== readerId && (
                  <ConfirmDelete
                    path={`/api/people/${id}`}
                    word="Close account"
                    about={name}
                    title={`Close the account of ${name}?`}
                    description="They are signed out at once, leave every production and can no longer sign in. What they made and said stays. Inviting them again opens the account anew."
                  />
                )}
              </Cell>
            </Row>
          ))}
        </tbody>
      </Table>
    </section>
  );
}
