export { SurveyScreen as Component } from "../../features/survey/survey-screen.tsx";
