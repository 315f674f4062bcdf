export { ReviewScreen as Component } from "../../features/review/review-screen.tsx";
