/** Always shown with results, in the memo and in the API's answers. */
export const CAUTION =
  "A screening estimate from simplified published methods. Not for navigation, search and rescue, evacuation or any emergency decision: " +
  "follow the national weather and maritime services. Local codes and a licensed professional's judgement come first. " +
  "Validate against measurements before design use.";
