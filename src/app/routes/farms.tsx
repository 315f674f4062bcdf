export { FarmsScreen as Component } from "../../features/farms/farms-screen.tsx";
