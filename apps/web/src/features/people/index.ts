export { DoorFrame } from "./sign-in/door-frame.tsx";
export { SignUpForm } from "./sign-up-form.tsx";
export { VerifyEmail } from "./verify-email.tsx";
export { AskForReset, SetNewPassword } from "./reset-password.tsx";
export { AcceptInvitation, isLinkToken } from "./invitation.tsx";
export { peopleQueries } from "./people.queries.ts";
export { PeopleScreen } from "./people-screen.tsx";
