import "@fontsource-variable/atkinson-hyperlegible-next/wght.css";
import "@fontsource-variable/overpass/wght.css";
import "./styles/main.css";
import { StrictMode } from "react";
import { createRoot } from "react-dom/client";
import { App } from "./app/app.tsx";

const root = document.getElementById("root");
if (root === null) throw new Error("the page has no root");
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
