/** Public address of an invented record that can be uploaded at once. */
export const SAMPLE_BUOY_FILE = "/samples/invented-storm-buoy.txt";
