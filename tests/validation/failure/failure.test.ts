import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./failure.rows.ts";

describeRows(topic, rows);
