export { NoAccessScreen as Component } from "../../features/session/no-access-screen.tsx";
