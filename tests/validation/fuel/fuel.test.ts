import { describeRows } from "../describe-rows.ts";
import { rows, topic } from "./fuel.rows.ts";

describeRows(topic, rows);
