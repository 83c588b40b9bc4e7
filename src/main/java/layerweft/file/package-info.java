/**
 * Files in: portfolios and programmes, read strictly.
 *
 * <p>A file goes through three steps. {@code SourceText} reads its bytes within limits and decodes them; {@code TreeParser} turns the text
 * into a tree of located {@code Node}s; the mappings ({@code PortfolioMapping}, {@code ProgrammeMapping} and theirs) describe the formats as
 * {@code Shape}s of {@code Field}s and build the model. Every step gathers faults, so that a user hears of all of them at once.
 */
package layerweft.file;
