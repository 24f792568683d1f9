const isWithin = (path: string, href: string) => path === href || path.startsWith(`${href}/`);

/** The href of the screen a path belongs to. A version belongs to Review for those who review, else to Shots. */
export function currentScreen(path: string, items: { href: string }[]): string | undefined {
  const homes = isWithin(path, "/versions") ? ["/review", "/shots"] : [path];
  return homes
    .map((home) => items.find(({ href }) => isWithin(home, href))?.href)
    .find((href) => href !== undefined);
}
