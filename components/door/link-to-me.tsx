"use client";

import { TextAction } from "../button/text-action";

/** Opens a letter to oneself with this page's address, to be opened on the computer that takes the files. */
export function LinkToMe({ title }: { title: string }) {
  const write = () => {
    const subject = encodeURIComponent(`Delivery: ${title}`);
    const body = encodeURIComponent(window.location.href);
    window.location.assign(`mailto:?subject=${subject}&body=${body}`);
  };
  return <TextAction onClick={write}>Send the link to mine</TextAction>;
}
