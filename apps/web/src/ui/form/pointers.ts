/** A JSON pointer into the body (RFC 6901) as the name of a form field: `/contacts/0/email` is `contacts.0.email`. */
export const fieldOfPointer = (pointer: string): string =>
  pointer
    .split("/")
    .slice(1)
    .map((part) => part.replace(/~1/g, "/").replace(/~0/g, "~"))
    .join(".");
