package nappe.cli;

import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import nappe.method.Declared;
import nappe.method.MethodCatalogue;
import nappe.method.MethodException;
import nappe.method.MethodLibrary;

/**
 * The methods as an input workbook asks for them. It notes which were asked for, and a method with faults declares nothing, so
 * that the workbook is read to its end and the faults of all its methods can be told together.
 */
final class AskedMethods implements MethodCatalogue {
    private final MethodLibrary methods;
    private final Set<String> asked = new TreeSet<>();

    AskedMethods(MethodLibrary methods) {
        this.methods = methods;
    }

    /** The names that were asked for and are known. */
    Set<String> asked() {
        return asked;
    }

    @Override
    public List<String> names() {
        return methods.names();
    }

    @Override
    public boolean knows(String name) {
        boolean known = methods.knows(name);
        if (known) {
            asked.add(name);
        }
        return known;
    }

    @Override
    public String title(String name) {
        return methods.title(name);
    }

    @Override
    public List<Declared> declared(String name) {
        try {
            return methods.declared(name);
        } catch (MethodException e) {
            return List.of();
        }
    }
}
