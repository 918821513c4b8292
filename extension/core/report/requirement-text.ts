export { formatLimits, formatRequirement } from '../checks/requirement-text.ts';
