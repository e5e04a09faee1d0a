export * from "./catalogue";
export * from "./checks";
export * from "./machines";
export * from "./people";
