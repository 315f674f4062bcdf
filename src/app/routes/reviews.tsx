export { ReviewsScreen as Component } from "../../features/review/reviews-screen.tsx";
