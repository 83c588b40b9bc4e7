/** Laws of the number of events of a peril in the contract year, and their tables for the engines. */
package layerweft.model.frequency;
