/** Every address the app links to, as functions, so that a moved page moves its links. */
export const routes = {
	home: () => '/' as const,
	signIn: () => '/sign-in' as const,
	signInLink: () => '/sign-in/link' as const,
	signOut: () => '/sign-out' as const,
	desk: () => '/desk' as const,
	manuscript: (slug: string) => `/pieces/${slug}/manuscript` as const,
	check: (slug: string) => `/pieces/${slug}/check` as const,
	release: (slug: string) => `/pieces/${slug}/release` as const,
	calculators: () => '/calculators' as const,
	calculator: (id: string) => `/calculators/${id}` as const,
	constantsEdition: (edition: string) => `/calculators/constants/${edition}` as const,
	newCalculator: () => '/calculators/house/new' as const,
	reviseCalculator: (id: string) => `/calculators/house/${id}/revise` as const,
	/** The public page of a piece: who made and checked it, its text, the snippet. */
	publicPage: (slug: string) => `/w/${slug}` as const,
	/** The frame for partner pages: newest release, or one numbered release for good. */
	frame: (slug: string, release: number | 'latest' = 'latest') => `/w/${slug}/${release}` as const,
	api: {
		draft: (slug: string) => `/api/pieces/${slug}/draft` as const,
		tryCalculator: () => '/api/calculators/try' as const,
		calculators: () => '/api/v1/calculators' as const,
		calculator: (id: string) => `/api/v1/calculators/${id}` as const
	}
};
