import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./livestock.rows.ts";

describeRows(topic, rows);
