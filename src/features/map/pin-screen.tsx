import { PageState } from "../../components/page-state.tsx";

export function PinScreen() {
  return <PageState kind="loading" words="Fetching the sheet" />;
}
