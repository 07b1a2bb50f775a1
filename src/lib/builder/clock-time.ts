/** The time of day in the writer's own zone: “10:02:14”. */
export function clockTime(at: string): string {
	return at ? new Date(at).toLocaleTimeString('en-GB') : '';
}
