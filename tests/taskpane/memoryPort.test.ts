import { memoryWorkbook } from './memoryPort';
import { portContract, portErrorCells } from './portContract';

portContract('the workbook in memory', memoryWorkbook);
portErrorCells('the workbook in memory', memoryWorkbook);
