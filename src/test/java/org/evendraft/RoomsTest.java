package org.evendraft;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;
import static org.assertj.core.api.Assertions.assertThat;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.domain.JavaClasses;
import com.tngtech.archunit.core.domain.JavaPackage;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import org.jdbi.v3.core.Handle;
import org.jspecify.annotations.NullMarked;

/** The order of the rooms: each uses only those below it. */
@AnalyzeClasses(packages = "org.evendraft", importOptions = ImportOption.DoNotIncludeTests.class)
class RoomsTest {

    @ArchTest
    static final ArchRule EACH_ROOM_USES_ONLY_THOSE_BELOW = layeredArchitecture()
            .consideringOnlyDependenciesInLayers()
            .layer("geometry")
            .definedBy("org.evendraft.geometry..")
            .layer("platform")
            .definedBy("org.evendraft.platform..")
            .layer("stability")
            .definedBy("org.evendraft.stability..")
            .layer("ballast")
            .definedBy("org.evendraft.ballast..")
            .layer("store")
            .definedBy("org.evendraft.store..")
            .layer("service")
            .definedBy("org.evendraft.service..")
            .layer("http")
            .definedBy("org.evendraft.http..")
            .layer("cli")
            .definedBy("org.evendraft.cli..")
            .layer("app")
            .definedBy("org.evendraft")
            .whereLayer("geometry")
            .mayNotAccessAnyLayer()
            .whereLayer("platform")
            .mayOnlyAccessLayers("geometry")
            .whereLayer("stability")
            .mayOnlyAccessLayers("geometry", "platform")
            .whereLayer("ballast")
            .mayOnlyAccessLayers("geometry", "platform", "stability")
            .whereLayer("store")
            .mayOnlyAccessLayers("geometry", "platform", "stability", "ballast")
            .whereLayer("service")
            .mayOnlyAccessLayers("geometry", "platform", "stability", "ballast", "store")
            .whereLayer("http")
            .mayOnlyAccessLayers("geometry", "platform", "stability", "ballast", "store", "service")
            .whereLayer("cli")
            .mayOnlyAccessLayers("geometry", "platform", "stability", "ballast", "store", "service")
            .whereLayer("app")
            .mayNotBeAccessedByAnyLayer();

    @ArchTest
    static final ArchRule GEOMETRY_STANDS_ALONE = classes()
            .that()
            .resideInAPackage("org.evendraft.geometry..")
            .should()
            .onlyDependOnClassesThat()
            .resideInAnyPackage("org.evendraft.geometry..", "java..", "org.jspecify..", "org.apache.commons.math3..");

    @ArchTest
    static final ArchRule NO_JAVALIN_OUTSIDE_HTTP = noClasses()
            .that()
            .resideOutsideOfPackage("org.evendraft.http..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("io.javalin..", "org.eclipse.jetty..", "jakarta.servlet..");

    @ArchTest
    static final ArchRule NO_SQL_OUTSIDE_STORE = noClasses()
            .that()
            .resideOutsideOfPackage("org.evendraft.store..")
            .should()
            .dependOnClassesThat(databaseClassesButHandles());

    /** A use case passes a transaction's handle from the database to the repositories; what is done with it is theirs alone. */
    private static DescribedPredicate<JavaClass> databaseClassesButHandles() {
        return DescribedPredicate.describe(
                "are of JDBC, Jdbi, the pool or the migrations, but for handles passed on",
                c -> !c.isEquivalentTo(Handle.class)
                        && c.getPackageName()
                                .matches(
                                        "(java\\.sql|javax\\.sql|org\\.jdbi|com\\.zaxxer|org\\.flywaydb|org\\.h2|org\\.postgresql)(\\..*)?"));
    }

    @ArchTest
    static final ArchRule HANDLES_ARE_ONLY_PASSED_ON = noClasses()
            .that()
            .resideOutsideOfPackage("org.evendraft.store..")
            .should()
            .callMethodWhere(DescribedPredicate.describe(
                    "the target is a method of a handle",
                    call -> call.getTargetOwner().isAssignableTo(Handle.class)));

    @ArchTest
    static final ArchRule HANDLES_STAY_IN_SERVICE_AND_STORE = noClasses()
            .that()
            .resideOutsideOfPackages("org.evendraft.store..", "org.evendraft.service..")
            .should()
            .dependOnClassesThat()
            .areAssignableTo(Handle.class);

    @ArchTest
    static final ArchRule NO_PICOCLI_OUTSIDE_CLI = noClasses()
            .that()
            .resideOutsideOfPackage("org.evendraft.cli..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("picocli..");

    @ArchTest
    static final ArchRule THE_ENGINE_READS_NO_CLOCK_AND_NO_FILES = noClasses()
            .that()
            .resideInAnyPackage("org.evendraft.stability..", "org.evendraft.ballast..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("java.io..", "java.nio..", "java.time..", "java.net..");

    @ArchTest
    static final ArchRule ROOMS_HAVE_NO_CYCLES =
            slices().matching("org.evendraft.(*)..").should().beFreeOfCycles();

    @ArchTest
    static void everyPackageIsNullMarked(JavaClasses classes) {
        assertThat(classes.getPackage("org.evendraft").getSubpackagesInTree())
                .isNotEmpty()
                .allSatisfy(p -> assertThat(nullMarked(p)).as(p.getName()).isTrue());
        assertThat(nullMarked(classes.getPackage("org.evendraft"))).isTrue();
    }

    private static boolean nullMarked(JavaPackage room) {
        return room.tryGetPackageInfo()
                .filter(info -> info.isAnnotatedWith(NullMarked.class))
                .isPresent();
    }
}
