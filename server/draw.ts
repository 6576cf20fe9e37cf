import { drawCommand } from './headless/draw-command';

process.exitCode = await drawCommand(process.argv.slice(2), {
  print: (text) => process.stdout.write(text),
  complain: (text) => process.stderr.write(text),
});
