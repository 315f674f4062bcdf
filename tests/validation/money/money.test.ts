import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./money.rows.ts";

describeRows(topic, rows);
