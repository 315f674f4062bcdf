import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./envelope.rows.ts";

describeRows(topic, rows);
