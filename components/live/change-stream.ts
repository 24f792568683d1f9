// One stream of changes for a whole page, however many of its parts listen: a browser allows few connections to a server.

/** What open pages are told of: the event's kind, and the ids of what it happened to. */
export interface Change {
  kind: string;
  [name: string]: string | number | null;
}

export interface Listener {
  onChange: (change: Change) => void;
  /** The stream was broken and is there again: something may have been missed. */
  onGap: () => void;
}

const listeners = new Set<Listener>();
let source: EventSource | undefined;

/** Listens until the returned function is called. */
export function listen(listener: Listener): () => void {
  listeners.add(listener);
  source ??= openStream();
  return () => {
    listeners.delete(listener);
    if (listeners.size > 0) return;
    source?.close();
    source = undefined;
  };
}

function openStream(): EventSource {
  const stream = new EventSource("/api/changes");
  let opened = false;
  stream.addEventListener("open", () => {
    if (opened) for (const { onGap } of listeners) onGap();
    opened = true;
  });
  stream.addEventListener("message", (message) => {
    const change = JSON.parse(String(message.data)) as Change;
    for (const { onChange } of listeners) onChange(change);
  });
  return stream;
}
