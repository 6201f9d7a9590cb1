import { answerNest } from './answer-nest';
import { runCommand } from './batch';

const command = { usage: 'npm run -s nest -- FILE|-', answer: answerNest };

void runCommand(command, process.argv.slice(2)).then((code) => {
  process.exitCode = code;
});
