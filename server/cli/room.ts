import { answerRoom } from './answer-room';
import { runCommand } from './batch';

const command = { usage: 'npm run -s room -- FILE|-', answer: answerRoom };

void runCommand(command, process.argv.slice(2)).then((code) => {
  process.exitCode = code;
});
