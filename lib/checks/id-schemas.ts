import { z } from "zod";

/** Made on the phone or the server: 26 letters of Crockford's base 32, sortable by time. */
export const ulidSchema = z.string().regex(/^[0-7][0-9A-HJKMNP-TV-Z]{25}$/, "An id has 26 letters and digits (ULID).");
/** Any stored id: seeded rows have readable ones. */
export const idSchema = z.string().regex(/^[0-9A-Za-z][0-9A-Za-z_-]{0,63}$/, "Not an id.");
