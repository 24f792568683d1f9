// The closed sets the database knows. Free of Drizzle, so that forms and workers may share them.
export const productionKinds = ["film", "dome"] as const;
export type ProductionKind = (typeof productionKinds)[number];

export const roles = ["artist", "advisor", "producer", "client"] as const;
export type Role = (typeof roles)[number];

export const holds = ["none", "on hold", "omitted"] as const;
export type Hold = (typeof holds)[number];

export const qualities = ["proof", "master"] as const;
export type Quality = (typeof qualities)[number];

export const colourSpaces = ["rec709", "acescg"] as const;
export type ColourSpace = (typeof colourSpaces)[number];

export const fileKinds = ["png", "exr"] as const;
export type FileKind = (typeof fileKinds)[number];

export const renderStates = ["rendering", "failed", "cancelled", "complete"] as const;
export type RenderState = (typeof renderStates)[number];

export const verdictKinds = ["signed off", "returned", "withdrawn"] as const;
export type VerdictKind = (typeof verdictKinds)[number];

export const receiptKinds = ["received", "refused"] as const;
export type ReceiptKind = (typeof receiptKinds)[number];

export const linkPurposes = ["invitation", "password reset"] as const;
export type LinkPurpose = (typeof linkPurposes)[number];

export const outboxKinds = ["mail", "job"] as const;
