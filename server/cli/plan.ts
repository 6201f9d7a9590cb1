import { answerPlan } from './answer-plan';
import { runCommand } from './batch';

const command = { usage: 'npm run -s plan -- FILE|- [--sheets DIR]', options: ['sheets'], answer: answerPlan };

void runCommand(command, process.argv.slice(2)).then((code) => {
  process.exitCode = code;
});
