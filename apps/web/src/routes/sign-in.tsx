import { SignInPage } from "../features/people/sign-in/sign-in-page.tsx";

export const SignIn = SignInPage;
