/** What a window remembers and guards: files, recent files, recovery after a crash, preferences. No scene types. */
package layerweft.desktop.habit;
