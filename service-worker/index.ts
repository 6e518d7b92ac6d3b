import { answerRequests } from "./requests";
import { keepFiles } from "./precache";
import { takeOverWhenAsked } from "./updates";

keepFiles();
answerRequests();
takeOverWhenAsked();
