export { SitesScreen as Component } from "../../features/sites/sites-screen.tsx";
