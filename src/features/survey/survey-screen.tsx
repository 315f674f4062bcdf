/** The survey of one building. */
export function SurveyScreen() {
  return <p className="p-4">Opening</p>;
}
