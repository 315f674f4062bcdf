export { FarmScreen as Component } from "../../features/farms/farm-screen.tsx";
