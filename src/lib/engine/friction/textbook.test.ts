import { describePublished, type PublishedFile } from '../../../../fixtures/published/published-checks';
import published from '../../../../fixtures/published/textbook.json';
import { textbookChecks } from '../published/textbook';

describePublished('friction and whole designs against worked examples', published as PublishedFile, textbookChecks);
