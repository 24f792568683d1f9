// Drizzle's relational client takes every table at once.
export * from "./deliveries";
export * from "./events";
export * from "./people";
export * from "./productions";
export * from "./reviews";
export * from "./shots";
export * from "./versions";
