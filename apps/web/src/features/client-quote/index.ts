export { ClientQuotePage } from "./client-quote-page.tsx";
