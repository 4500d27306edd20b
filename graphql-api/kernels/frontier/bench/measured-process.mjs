import { text } from 'node:stream/consumers';
import * as measurements from './measurements.mjs';

// One measurement: its name and task come in as JSON, what it gives goes out as JSON.

const { name, task } = JSON.parse(await text(process.stdin));
const outcome = await measurements[name](task);
const megabytes = process.resourceUsage().maxRSS / 1024;
process.stdout.write(JSON.stringify({ ...outcome, megabytes }));
