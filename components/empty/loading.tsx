/** A page on its way. Words only: nothing moves that does not mean something. */
export function Loading({ what }: { what: string }) {
  return (
    <p role="status" className="type-body px-16 py-48 text-soft sm:px-48">
      Fetching {what}.
    </p>
  );
}
