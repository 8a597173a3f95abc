export { NothingHere as Component } from "../app/route-error.tsx";
