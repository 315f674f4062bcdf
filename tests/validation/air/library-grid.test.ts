import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./library-grid.rows.ts";

describeRows(topic, rows);
