import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./barn.rows.ts";

describeRows(topic, rows);
