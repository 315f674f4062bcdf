export { PinScreen as Component } from "../../features/map/pin-screen.tsx";
