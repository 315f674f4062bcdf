export { SizingScreen as Component } from "../../features/plan/sizing-screen.tsx";
