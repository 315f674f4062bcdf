import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./condensation.rows.ts";

describeRows(topic, rows);
