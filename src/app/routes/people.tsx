export { PeopleScreen as Component } from "../../features/people/people-screen.tsx";
