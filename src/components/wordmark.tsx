import markUrl from "../assets/logo.svg?raw";

/** Sign and name, in the colour of the text around them. The file is our own and holds no script. */
export function Wordmark({ heightPx = 34 }: { heightPx?: number }) {
  return (
    <span
      role="img"
      aria-label="Glassbyre"
      className="inline-flex text-ink [&_svg]:h-full [&_svg]:w-auto"
      style={{ height: heightPx }}
      // biome-ignore lint/security/noDangerouslySetInnerHtml: a drawing bundled with the pages, never input
      dangerouslySetInnerHTML={{ __html: markUrl }}
    />
  );
}
