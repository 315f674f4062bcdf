import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./cases.rows.ts";

describeRows(topic, rows);
