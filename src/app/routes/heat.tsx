export { HeatScreen as Component } from "../../features/plan/heat-screen.tsx";
