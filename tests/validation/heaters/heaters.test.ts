import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./heaters.rows.ts";

describeRows(topic, rows);
