/** Browser features that neither the house's pages nor its frames use: a closed list, so that no page around lends them. */
const OFF = [
	'accelerometer',
	'attribution-reporting',
	'bluetooth',
	'browsing-topics',
	'camera',
	'display-capture',
	'geolocation',
	'gyroscope',
	'hid',
	'idle-detection',
	'magnetometer',
	'microphone',
	'midi',
	'payment',
	'screen-wake-lock',
	'serial',
	'usb'
];

/** The value of the Permissions-Policy header. */
export const PERMISSIONS_POLICY = [
	...OFF.map((feature) => `${feature}=()`),
	'fullscreen=(self)'
].join(', ');
