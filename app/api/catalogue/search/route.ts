import { route } from "@/lib/action";
import { searchEntries } from "@/lib/catalogue/search-entries";
import { searchInputOf } from "@/lib/catalogue/search-params";

/** GET ?q=&kind=&quantity=&connector=&supply=&colour=&page= ; facets may be repeated. Answers a SearchResult. */
export const GET = route("catalogue:read", ({ person, query }) => searchEntries(person, searchInputOf(query)));
