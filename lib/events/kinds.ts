// Every kind of event, with the sentence it is read as. `by` is the actor's name at the time.
type Words = Record<string, string | number>;

export const eventSentences = {
  "studio.made": (w: Words) => `The studio ${w.studio} was set up.`,
  "demonstration.made": (w: Words) => `${w.by} finished the demonstration.`,
  "production.made": (w: Words) => `${w.by} began the production ${w.production}.`,
  "person.invited": (w: Words) => `${w.by} invited ${w.email} as ${w.role}.`,
  "invitation.revoked": (w: Words) => `${w.by} took back the invitation to ${w.email}.`,
  "person.joined": (w: Words) => `${w.by} joined as ${w.role}.`,
  "person.removed": (w: Words) => `${w.by} ended ${w.person}'s membership.`,
  "person.left": (w: Words) => `${w.by} closed the account of ${w.person}.`,
  "password.changed": (w: Words) => `${w.by} set a new password.`,
  "sequence.made": (w: Words) => `${w.by} added the sequence ${w.sequence}.`,
  "shot.made": (w: Words) => `${w.by} added ${w.shot}.`,
  "shot.changed": (w: Words) => `${w.by} changed ${w.what} of ${w.shot}.`,
  "shot.held": (w: Words) => `${w.by} put ${w.shot} on hold.`,
  "shot.omitted": (w: Words) => `${w.by} marked ${w.shot} omitted.`,
  "shot.released": (w: Words) => `${w.by} took ${w.shot} up again.`,
  "version.made": (w: Words) => `${w.by} began version ${w.version} of ${w.shot}: ${w.frames}, ${w.quality}.`,
  "version.complete": (w: Words) => `Version ${w.version} of ${w.shot} is whole: ${w.frames}.`,
  "version.failed": (w: Words) => `Version ${w.version} of ${w.shot} stopped at frame ${w.frame}: ${w.why}`,
  "version.cancelled": (w: Words) => `${w.by} cancelled version ${w.version} of ${w.shot}.`,
  "version.resumed": (w: Words) => `${w.by} resumed version ${w.version} of ${w.shot}.`,
  "review.sent": (w: Words) => `${w.by} sent version ${w.version} of ${w.shot} for review.`,
  "verdict.signed": (w: Words) => `${w.by} signed off version ${w.version} of ${w.shot}, ${w.frames}.`,
  "verdict.returned": (w: Words) => `${w.by} returned version ${w.version} of ${w.shot}: “${w.words}”`,
  "verdict.withdrawn": (w: Words) =>
    `${w.by} withdrew the verdict on version ${w.version} of ${w.shot}: “${w.words}”`,
  "delivery.made": (w: Words) => `${w.by} assembled delivery ${w.delivery}, ${w.title}.`,
  "delivery.published": (w: Words) => `${w.by} published delivery ${w.delivery} to ${w.to}.`,
  "delivery.withdrawn": (w: Words) => `${w.by} withdrew delivery ${w.delivery}: “${w.words}”`,
  "delivery.taken": (w: Words) => `${w.by} took ${w.what} of delivery ${w.delivery}.`,
  "delivery.damaged": (w: Words) =>
    `A download of delivery ${w.delivery} broke off: ${w.file} in storage is not as it was signed.`,
  "receipt.signed": (w: Words) => `${w.by} received delivery ${w.delivery}: ${w.files} files, all as signed.`,
  "receipt.refused": (w: Words) => `${w.by} refused delivery ${w.delivery}: “${w.words}”`,
} as const;

export type EventKind = keyof typeof eventSentences;
