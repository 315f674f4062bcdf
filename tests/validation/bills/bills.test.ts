import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./bills.rows.ts";

describeRows(topic, rows);
