import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./burning.rows.ts";

describeRows(topic, rows);
