import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./solar.rows.ts";

describeRows(topic, rows);
