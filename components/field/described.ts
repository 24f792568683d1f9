/** The ids that describe a control, for aria-describedby; absent ones are left out. */
export function joinIds(...ids: (string | false | undefined)[]): string | undefined {
  return ids.filter(Boolean).join(" ") || undefined;
}
