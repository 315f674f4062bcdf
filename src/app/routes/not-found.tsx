import { PageState } from "../../components/page-state.tsx";

export function Component() {
  return (
    <PageState
      kind="empty"
      title="There is no such page"
      words="The address may be mistyped, or what it showed is gone. The head of the page leads back."
    />
  );
}
