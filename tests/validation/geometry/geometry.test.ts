import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./geometry.rows.ts";

describeRows(topic, rows);
