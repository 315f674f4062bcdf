export { SignInScreen as Component } from "../../features/session/sign-in-screen.tsx";
