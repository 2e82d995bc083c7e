import { StepFailed } from '../steps/processes.mjs';

const usage = 'Usage: npm run bank:audit [-- [--only ID] [--draws N]]';
const mostDraws = 1_000_000;

/** What the command line asks for. */
export function readOptions(args) {
  const options = { only: null, draws: 10_000 };
  for (let at = 0; at < args.length; at += 2) {
    const [name, value] = [args[at], args[at + 1]];
    if (name === '--only' && value) options.only = value;
    else if (name === '--draws' && /^\d+$/.test(value ?? '')) options.draws = Number(value);
    else throw new StepFailed(`Unknown: ${args.slice(at).join(' ')}. ${usage}`);
  }
  if (options.draws < 1 || options.draws > mostDraws) {
    throw new StepFailed(`${options.draws} draws are outside 1 to ${mostDraws}. ${usage}`);
  }
  return options;
}
