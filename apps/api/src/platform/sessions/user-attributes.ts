import type { Membership } from "../http/route.ts";

/** What is known of a person with each request. */
export interface UserAttributes {
  readonly name: string;
  readonly email: string;
  readonly emailVerified: boolean;
  readonly memberships: readonly Membership[];
}
