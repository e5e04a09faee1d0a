export * from "./catalogue";
export * from "./checks";
export * from "./confirmations";
export * from "./machines";
export * from "./people";
