export { MapScreen as Component } from "../../features/map/map-screen.tsx";
