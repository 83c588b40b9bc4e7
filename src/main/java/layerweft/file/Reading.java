package layerweft.file;

/** How a value of a file becomes a value of the model. */
@FunctionalInterface
interface Reading<T> {

    /**
     * @param path of the value in the file
     * @return the value; null if it is faulty, with its faults added
     */
    T read(Node node, String path, Faults faults);
}
