import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./air.rows.ts";

describeRows(topic, rows);
